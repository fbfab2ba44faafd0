/**
 * Once per run: a migrated database to copy from. In the PostgreSQL that npm test has started, or
 * in one of its own.
 */

import type { TestProject } from 'vitest/node';
import { appUrlOf } from '../../scripts/app-url.mjs';
import { prepareDatabase } from '../../scripts/prepare-database';
import { startThrowawayPostgres } from '../../scripts/postgres.mjs';

declare module 'vitest' {
  export interface ProvidedContext {
    /** Address of the database that every test file copies. */
    template: string;
    /** The same address for the application's own role. */
    application: string;
  }
}

export default async function setup(project: TestProject): Promise<() => Promise<void>> {
  const given = process.env.TEST_DATABASE_URL;
  const cluster = given ? null : await startThrowawayPostgres();
  const template = given ?? cluster!.ensureDatabase('template');
  const application = appUrlOf(template, 'for tests alone');
  await prepareDatabase(template, application);
  project.provide('template', template);
  project.provide('application', application);
  return async () => cluster?.stop();
}
