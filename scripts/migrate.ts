/**
 * Brings the database at OWNER_DATABASE_URL to the newest migration, for the application's role at
 * DATABASE_URL. Safe to run at every start.
 */

import { prepareDatabase } from './prepare-database';

const { OWNER_DATABASE_URL: owner, DATABASE_URL: app } = process.env;
if (!owner || !app) throw new Error('migrate: give OWNER_DATABASE_URL and DATABASE_URL');
for (const name of await prepareDatabase(owner, app)) console.log(`Migrated: ${name}`);
