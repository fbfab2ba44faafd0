import 'server-only';
import { MikroORM, type EntityManager } from '@mikro-orm/postgresql';
import { Pool } from 'pg';
import config from '@/mikro-orm.config';
import { env } from './env';
import { log } from './log';

// On globalThis, because Next loads this file once per bundle, and again at each reload in dev.
const store = globalThis as typeof globalThis & {
  vaneloftOrm?: Promise<MikroORM>;
  vaneloftPool?: Pool;
};

/** Milliseconds to wait for a connection before answering that the database is not there. */
const CONNECT_TIMEOUT = 5_000;

/** The one ORM of this process. The promise is stored before its first await. */
function orm(): Promise<MikroORM> {
  store.vaneloftOrm ??= MikroORM.init({
    ...config,
    clientUrl: env().DATABASE_URL,
    driverOptions: { connection: { connectionTimeoutMillis: CONNECT_TIMEOUT } },
  }).catch((error: unknown) => {
    // The next request tries again.
    store.vaneloftOrm = undefined;
    throw error;
  });
  return store.vaneloftOrm;
}

/**
 * Whose rows a transaction may see and write; the database itself holds to it (006-walls). Each
 * names one way to be let in: a workshop, a person, an email at the door, a link's hashed secret.
 */
export interface Scope {
  readonly workshop?: string;
  readonly user?: string;
  readonly email?: string;
  readonly token?: string;
}

/** A transaction that sees the rows of one scope and no others. */
export async function within<T>(
  { workshop = '', user = '', email = '', token = '' }: Scope,
  work: (tx: EntityManager) => T | Promise<T>,
): Promise<T> {
  const em = (await orm()).em.fork();
  return em.transactional(async (tx) => {
    await tx.execute(
      `select set_config('vaneloft.workshop', ?, true), set_config('vaneloft.user', ?, true),
        set_config('vaneloft.email', ?, true), set_config('vaneloft.token', ?, true)`,
      [workshop, user, email, token],
    );
    return work(tx);
  });
}

/** A transaction in the workshop of the person who asks. */
export const inWorkshop = <T>(
  { workshopId, userId }: { readonly workshopId: string; readonly userId: string },
  work: (tx: EntityManager) => T | Promise<T>,
): Promise<T> => within({ workshop: workshopId, user: userId }, work);

/** Plain connections, for the count of sign-in attempts. */
export function pool(): Pool {
  if (!store.vaneloftPool) {
    store.vaneloftPool = new Pool({
      connectionString: env().DATABASE_URL,
      max: 4,
      connectionTimeoutMillis: CONNECT_TIMEOUT,
      allowExitOnIdle: true,
    });
    // An idle connection that the server ends must not end the process.
    store.vaneloftPool.on('error', (error) =>
      log.warn({ err: error }, 'database connection lost'),
    );
  }
  return store.vaneloftPool;
}

/** Lets go of every connection. */
export async function closeDatabase(): Promise<void> {
  const { vaneloftOrm, vaneloftPool } = store;
  store.vaneloftOrm = undefined;
  store.vaneloftPool = undefined;
  await vaneloftPool?.end();
  await (await vaneloftOrm)?.close();
}

/** One question to the database. @throws when it does not answer. */
export async function pingDatabase(): Promise<void> {
  await pool().query('select 1');
}
