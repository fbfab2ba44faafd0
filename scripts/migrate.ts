/** Brings the database at DATABASE_URL to the newest migration. Safe to run at every start. */

import { MikroORM } from '@mikro-orm/postgresql';
import config from '../mikro-orm.config';

// Two starts at once must not run the same migration twice; the number is ours alone.
const MIGRATION_LOCK = 80_411_907;

const orm = await MikroORM.init(config);
try {
  const holder = await orm.em.getKnex().client.acquireConnection();
  try {
    await holder.query('select pg_advisory_lock($1)', [MIGRATION_LOCK]);
    const done = await orm.migrator.up();
    for (const { name } of done) console.log(`Migrated: ${name}`);
  } finally {
    await holder.query('select pg_advisory_unlock($1)', [MIGRATION_LOCK]);
    await orm.em.getKnex().client.releaseConnection(holder);
  }
} finally {
  await orm.close();
}
