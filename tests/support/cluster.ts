/** Once per run: a PostgreSQL of its own, and in it a migrated database to copy from. */

import { MikroORM } from '@mikro-orm/postgresql';
import type { TestProject } from 'vitest/node';
import config from '@/mikro-orm.config';
import { startThrowawayPostgres } from '../../scripts/postgres.mjs';

declare module 'vitest' {
  export interface ProvidedContext {
    /** Address of the database that every test file copies. */
    template: string;
  }
}

export default async function setup(project: TestProject): Promise<() => Promise<void>> {
  const cluster = await startThrowawayPostgres();
  const template = cluster.ensureDatabase('template');
  const orm = await MikroORM.init({ ...config, clientUrl: template });
  await orm.migrator.up();
  await orm.close();
  project.provide('template', template);
  return () => cluster.stop();
}
