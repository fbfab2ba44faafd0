/**
 * Once per run: a migrated database to copy from. In the PostgreSQL that npm test has started, or
 * in one of its own.
 */

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
  const given = process.env.TEST_DATABASE_URL;
  const cluster = given ? null : await startThrowawayPostgres();
  const template = given ?? cluster!.ensureDatabase('template');
  const orm = await MikroORM.init({ ...config, clientUrl: template });
  await orm.migrator.up();
  await orm.close();
  project.provide('template', template);
  return async () => cluster?.stop();
}
