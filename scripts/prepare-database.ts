import { runMigrations } from 'graphile-worker';
import { MikroORM } from '@mikro-orm/postgresql';
import { Client } from 'pg';
import { rightsSql } from '../migrations/app-role';
import config from '../mikro-orm.config';

// Two starts at once must not run the same migration twice; the number is ours alone.
const MIGRATION_LOCK = 80_411_907;

/** Makes the application's role, or gives it the password that its address holds. */
async function makeRole(client: Client, appUrl: string): Promise<void> {
  const url = new URL(appUrl);
  const name = decodeURIComponent(url.username);
  const role = client.escapeIdentifier(name);
  const password = client.escapeLiteral(decodeURIComponent(url.password));
  const known = await client.query('select 1 from pg_roles where rolname = $1', [name]);
  const verb = known.rowCount ? 'alter' : 'create';
  await client.query(
    `${verb} role ${role} login password ${password} nosuperuser nocreatedb nocreaterole`,
  );
  await client.query(rightsSql(name));
}

/**
 * Brings a database to the newest migration and gives the application's role its rights there.
 * Safe to run at every start. Resolves to the names of the migrations that were run.
 */
export async function prepareDatabase(ownerUrl: string, appUrl: string): Promise<string[]> {
  const client = new Client({ connectionString: ownerUrl });
  await client.connect();
  try {
    await client.query('select pg_advisory_lock($1)', [MIGRATION_LOCK]);
    await runMigrations({ connectionString: ownerUrl });
    const orm = await MikroORM.init({ ...config, clientUrl: ownerUrl });
    let done;
    try {
      done = await orm.migrator.up();
    } finally {
      await orm.close();
    }
    await makeRole(client, appUrl);
    return done.map(({ name }) => name);
  } finally {
    await client.end();
  }
}
