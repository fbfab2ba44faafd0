/** Per test file: a fresh copy of the migrated database, and the environment that names it. */

import { randomUUID } from 'node:crypto';
import { Client } from 'pg';
import { afterAll, inject } from 'vitest';

const template = new URL(inject('template'));
const name = `t_${randomUUID().replaceAll('-', '')}`;

async function asAdministrator(sql: string): Promise<void> {
  const address = new URL(template);
  address.pathname = '/postgres';
  const client = new Client({ connectionString: address.href });
  await client.connect();
  // Copies of one template are made one at a time.
  await client.query('select pg_advisory_lock(1)');
  await client.query(sql);
  await client.end();
}

await asAdministrator(`create database ${name} template template`);
for (const [variable, known] of [
  ['OWNER_DATABASE_URL', template],
  ['DATABASE_URL', new URL(inject('application'))],
] as const) {
  const address = new URL(known);
  address.pathname = `/${name}`;
  process.env[variable] = address.href;
}
process.env.NEXTAUTH_URL = 'http://127.0.0.1:3000';
process.env.NEXTAUTH_SECRET = randomUUID();
// Threads would have to read the whole kernel again for each test file.
process.env.KERNEL_THREADS = '0';
process.env.LOG_LEVEL ??= 'silent';

afterAll(async () => {
  const { closeDatabase } = await import('@/lib/db');
  await closeDatabase();
  await (await import('./as-owner')).closeOwner();
  await asAdministrator(`drop database ${name} with (force)`);
});
