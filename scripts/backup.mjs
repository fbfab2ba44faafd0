/**
 * npm run backup -- FILE: all that the database holds, into one file. The workshop may go on
 * working meanwhile: the file holds one moment. Sessions' secret and the demo's passwords are not
 * in it; they are in .data/ or with whoever runs the database.
 */

import { resolve } from 'node:path';
import { databases } from './databases.mjs';
import { dumpTo } from './dump.mjs';
import { makeData } from './paths.mjs';
import { runUntilStopped, Stop } from './stop.mjs';

await runUntilStopped(async () => {
  const [file] = process.argv.slice(2);
  if (!file) throw new Stop('Name the file: npm run backup -- vaneloft.dump');
  makeData();
  dumpTo((await databases({ borrow: true })).OWNER_DATABASE_URL, resolve(file));
  console.log(`Backup in ${file}`);
});
