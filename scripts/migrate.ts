/**
 * Brings a database to the newest migration and gives the application's role its rights. Takes
 * DATABASE_URL alone, or OWNER_DATABASE_URL with the application's address beside it. Safe to run
 * at every start. `--show` prints the application's address, for machines that get no other.
 */

import { appUrlOf } from './app-url.mjs';
import { prepareDatabase } from './prepare-database';

const { OWNER_DATABASE_URL, DATABASE_URL, NEXTAUTH_SECRET } = process.env;
const owner = OWNER_DATABASE_URL || DATABASE_URL;
if (!owner || !DATABASE_URL) throw new Error('migrate: give DATABASE_URL');
if (!OWNER_DATABASE_URL && !NEXTAUTH_SECRET) throw new Error('migrate: give NEXTAUTH_SECRET');
const app = OWNER_DATABASE_URL ? DATABASE_URL : appUrlOf(owner, NEXTAUTH_SECRET!);
for (const name of await prepareDatabase(owner, app)) console.log(`Migrated: ${name}`);
if (process.argv.includes('--show')) console.log(app);
