/** A backup is taken of a workshop at work and put into another database, by the two commands. */

import { execFile } from 'node:child_process';
import { randomUUID } from 'node:crypto';
import { mkdtempSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { promisify } from 'node:util';
import { Client } from 'pg';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { createDesign } from '@/lib/create-design';
import { defaultDesign } from '@/geometry';
import { saveDesign } from '@/lib/save-design';
import { appUrlOf } from '../../scripts/app-url.mjs';
import { Cast } from '../support/cast';

const folder = mkdtempSync(join(tmpdir(), 'vaneloft-backup-'));
const file = join(folder, 'workshop.dump');
const name = `restored_${randomUUID().replaceAll('-', '')}`;
const secret = 'of the restored database alone';
let restored: string;

/** Runs one of the commands as npm does, against a database that is given. */
const command = (script: string, url: string, path: string) =>
  promisify(execFile)(process.execPath, [join('scripts', script), path], {
    env: { ...process.env, DATABASE_URL: url, OWNER_DATABASE_URL: '', NEXTAUTH_SECRET: secret },
  });

/** Every row of every table, as text. */
async function contents(url: string): Promise<Record<string, string>> {
  const client = new Client({ connectionString: url });
  await client.connect();
  const tables = await client.query<{ name: string }>(
    `select table_name as name from information_schema.tables
     where table_schema = 'public' and table_name <> 'sign_in_attempts' order by 1`,
  );
  const all: Record<string, string> = {};
  for (const { name: table } of tables.rows) {
    const { rows } = await client.query<{ all: string }>(
      `select coalesce(string_agg(t::text, E'\\n' order by t::text), '') as all from ${table} t`,
    );
    all[table] = rows[0]!.all;
  }
  await client.end();
  return all;
}

async function administer(sql: string): Promise<void> {
  const address = new URL(process.env.OWNER_DATABASE_URL!);
  address.pathname = '/postgres';
  const client = new Client({ connectionString: address.href });
  await client.connect();
  await client.query(sql);
  await client.end();
}

beforeAll(async () => {
  const cast = await Cast.gather();
  cast.ask('builder');
  const { id } = await createDesign({ name: 'Ærø µ, “kept”' });
  await saveDesign(id, { version: 1, name: 'Second', design: defaultDesign() });
  await administer(`create database ${name}`);
  const address = new URL(process.env.OWNER_DATABASE_URL!);
  address.pathname = `/${name}`;
  restored = address.href;
});
afterAll(async () => {
  await administer(`drop database ${name} with (force)`);
  await administer(`drop role if exists ${name}_app`);
  rmSync(folder, { recursive: true });
});

test('holds everything, and the application can work on it', async () => {
  const owner = process.env.OWNER_DATABASE_URL!;
  await command('backup.mjs', owner, file);
  // Nobody else on the machine may read it.
  expect(statSync(file).mode & 0o777).toBe(0o600);
  await command('restore.mjs', restored, file);
  const before = await contents(owner);
  expect(before.record_entries).toContain('design-saved');
  expect(await contents(restored)).toEqual(before);

  const app = new Client({ connectionString: appUrlOf(restored, secret) });
  await app.connect();
  await app.query("select set_config('vaneloft.workshop', id::text, false) from workshops");
  await expect(app.query('delete from record_entries')).rejects.toThrow(/permission denied/);
  await app.end();
}, 60_000);

test('a file that is no backup changes nothing', async () => {
  const broken = join(folder, 'broken.dump');
  writeFileSync(broken, 'not a dump');
  const before = await contents(restored);
  await expect(command('restore.mjs', restored, broken)).rejects.toThrow(
    /The restore failed; nothing was changed/,
  );
  expect(await contents(restored)).toEqual(before);
}, 60_000);

test('a backup never overwrites another', async () => {
  await expect(command('backup.mjs', process.env.OWNER_DATABASE_URL!, file)).rejects.toThrow(
    /is there already/,
  );
});
