import { Client } from 'pg';
import { beforeAll, describe, expect, test, vi } from 'vitest';
import { GET as HEALTH } from '@/app/api/health/route';
import { closeDatabase } from '@/lib/db';
import { entityManager } from '../support/as-owner';
import { saveDesign } from '@/lib/save-design';
import { defaultDesign } from '@/geometry';
import { call, refusal } from '../support/call';
import { Cast, storedDesign } from '../support/cast';

let cast: Cast;

beforeAll(async () => {
  cast = await Cast.gather();
});

describe('the record', () => {
  test.each([
    "update record_entries set what = 'design-saved'",
    "update record_entries set what = 'design-saved' where false",
    'delete from record_entries',
    'truncate record_entries',
    'truncate workshops cascade',
  ])('refuses: %s', async (sql) => {
    const id = await cast.design();
    cast.ask('builder');
    await saveDesign(id, { version: 1, name: 'Kept', design: defaultDesign() });
    const em = await entityManager();
    await expect(em.execute(sql)).rejects.toThrow(/record_entries only takes new rows/);
    expect(await cast.record(id)).toHaveLength(1);
  });

  test('a change that can not be recorded is not made', async () => {
    const id = await cast.design();
    cast.ask('builder');
    const em = await entityManager();
    await em.execute(
      'alter table record_entries add constraint closed check (false) not valid',
    );
    try {
      const change = { version: 1, name: 'Unrecorded', design: defaultDesign() };
      await expect(saveDesign(id, change)).rejects.toThrow();
      expect(await storedDesign(id)).toMatchObject({ version: 1, name: 'Bench section' });
    } finally {
      await em.execute('alter table record_entries drop constraint closed');
    }
  });
});

test('an email in capitals is refused by the database itself', async () => {
  const em = await entityManager();
  const sql = `insert into users values (gen_random_uuid(), now(), 'A@b.example', 'A', 'x', 0)`;
  await expect(em.execute(sql)).rejects.toThrow(/users_email_check/);
});

describe('without its database', () => {
  test('health and routes answer 503, and 200 once it is back', async () => {
    expect((await call(HEALTH, {})).status).toBe(200);
    await closeDatabase();
    const address = process.env.DATABASE_URL!;
    // Nothing listens on port 1.
    process.env.DATABASE_URL = address.replace(/:\d+\//, ':1/');
    vi.resetModules();
    const health = await import('@/app/api/health/route');
    const designs = await import('@/app/api/designs/route');
    try {
      cast.ask('owner');
      for (const answer of [await call(health.GET, {}), await call(designs.GET, {})]) {
        expect(answer.status).toBe(503);
        const error = await refusal(answer);
        expect(error.code).toBe('unavailable');
        expect(error.message).not.toMatch(/ECONN|127\.0\.0\.1|app/);
      }
    } finally {
      await (await import('@/lib/db')).closeDatabase();
      process.env.DATABASE_URL = address;
      vi.resetModules();
    }
    const back = await import('@/app/api/designs/route');
    expect((await call(back.GET, {})).status).toBe(200);
  });
});

test('connections that the database has ended are replaced', async () => {
  cast.ask('owner');
  const { GET } = await import('@/app/api/designs/route');
  const health = await import('@/app/api/health/route');
  const both = async () => [(await call(GET, {})).status, (await call(health.GET, {})).status];
  expect(await both()).toEqual([200, 200]);
  const client = new Client({ connectionString: process.env.OWNER_DATABASE_URL });
  await client.connect();
  const ended = await client.query(
    'select pg_terminate_backend(pid) from pg_stat_activity where datname = current_database() and usename <> current_user',
  );
  await client.end();
  expect(ended.rowCount).toBeGreaterThan(1);
  // The one that meets the end of a connection may be told to try again; nobody after it.
  for (const status of await both()) expect([200, 503]).toContain(status);
  expect(await both()).toEqual([200, 200]);
});
