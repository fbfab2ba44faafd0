/**
 * npm run restore -- FILE: puts a backup in the place of all that the database holds, or of an
 * empty one; after a failure it holds what it held. Newer tables are made by the migration that
 * follows. Mail that waited at the time of the backup is sent again: stop the worker first if it
 * must not be.
 */

import { resolve } from 'node:path';
import { mustRun } from './command.mjs';
import { databases } from './databases.mjs';
import { restoreFrom } from './dump.mjs';
import { makeData } from './paths.mjs';
import { runUntilStopped, Stop } from './stop.mjs';

await runUntilStopped(async () => {
  const [file] = process.argv.slice(2);
  if (!file) throw new Stop('Name the file: npm run restore -- vaneloft.dump');
  makeData();
  const env = await databases({ borrow: true });
  await restoreFrom(env.OWNER_DATABASE_URL, resolve(file));
  await mustRun('The migration', process.execPath, ['--import', 'tsx', 'scripts/migrate.ts'], {
    env: { ...process.env, ...env },
  });
  console.log(`Restored from ${file}`);
});
