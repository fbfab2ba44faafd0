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

/** An entity manager of its own for one request. */
export async function entityManager(): Promise<EntityManager> {
  return (await orm()).em.fork();
}

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
