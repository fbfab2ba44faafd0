/** The database's own wall between workshops, with the code's guards left out. */

import { randomUUID } from 'node:crypto';
import { Client } from 'pg';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { within, type Scope } from '@/lib/db';
import { createDesign } from '@/lib/create-design';
import { entityManager } from '../support/as-owner';
import { Cast } from '../support/cast';

/** The application's own connection, as somebody who got hold of it would have it. */
let app: Client;
let cast: Cast;
let otherWorkshop: string;

/** Tables without a workshop's rows: the count of sign-ins, and what has been migrated. */
const WITHOUT_ROWS_OF_A_WORKSHOP = ['migrations', 'sign_in_attempts'];

const rowsOf = async (table: string, scope: Scope): Promise<number> => {
  const [row] = await within(scope, (tx) =>
    tx.execute<{ count: string }[]>(`select count(*) from ${table}`),
  );
  return Number(row!.count);
};

/** One row in each table for our workshop, put there by the owner of the tables. */
async function fillTables(): Promise<void> {
  const em = await entityManager();
  const [workshop, user] = [cast.workshopId, cast.person('owner').id];
  const design = await cast.design();
  const sheet = await cast.item('sheet', 'Brass', { count: 3 } as never);
  const machine = await cast.item('machine', 'Laser', {} as never);
  const [revision, order, message] = [randomUUID(), randomUUID(), randomUUID()];
  const hash = 'a'.repeat(43);
  const statements: [string, unknown[]][] = [
    [
      `insert into invitations (id, created_at, workshop_id, email, role, token_hash, invited_by_id, expires_at)
       values (?, now(), ?, 'new@test.example', 'builder', ?, ?, now())`,
      [randomUUID(), workshop, hash, user],
    ],
    [
      `insert into password_resets (id, created_at, user_id, token_hash, expires_at)
       values (?, now(), ?, ?, now())`,
      [randomUUID(), user, hash],
    ],
    [
      `insert into mails (id, created_at, workshop_id, kind, event, to_address, subject, text, html, secret, attempts)
       values (?, now(), ?, 'k', 'e', 'new@test.example', 's', 't', 'h', false, 0)`,
      [randomUUID(), workshop],
    ],
    [
      `insert into design_versions (id, created_at, workshop_id, design_id, version, name, parameters, parameters_format, kernel, checks, saved_by_id)
       values (?, now(), ?, ?, 99, 'n', '{}', 1, 'k', '{}', ?)`,
      [randomUUID(), workshop, design, user],
    ],
    [
      `insert into revisions (id, created_at, workshop_id, design_id, number, name, note, design_name, version, parameters, parameters_format, kernel, checks, derivation, state, waivers, created_by_id, updated_at)
       values (?, now(), ?, ?, 1, 'n', '', 'n', 1, '{}', 1, 'k', '{}', '{}', 'draft', '[]', ?, now())`,
      [revision, workshop, design, user],
    ],
    [
      `insert into revision_files (id, created_at, workshop_id, revision_id, position, name, label, kind, media_type, bytes, sha256, body)
       values (?, now(), ?, ?, 0, 'f', 'l', 'dxf', 't', 1, 'h', 'x')`,
      [randomUUID(), workshop, revision],
    ],
    [
      `insert into cut_orders (id, created_at, workshop_id, number, revision_id, quantity, machine_id, sheet_id, sheets, due_on, note, state, version, ordered_by_id, updated_at)
       values (?, now(), ?, 1, ?, 1, ?, ?, 1, '2030-01-01', '', 'queued', 1, ?, now())`,
      [order, workshop, revision, machine, sheet, user],
    ],
    [
      `insert into order_messages (id, created_at, workshop_id, order_id, author_id, kind, text)
       values (?, now(), ?, ?, ?, 'remark', 't')`,
      [message, workshop, order, user],
    ],
    [
      `insert into attachments (id, created_at, workshop_id, message_id, name, media_type, bytes, sha256, body)
       values (?, now(), ?, ?, 'n', 't', 1, 'h', 'x')`,
      [randomUUID(), workshop, message],
    ],
  ];
  for (const [sql, values] of statements) await em.execute(sql, values);
}

async function tablesWithRows(): Promise<string[]> {
  const em = await entityManager();
  const found = await em.execute<{ name: string }[]>(
    "select table_name as name from information_schema.tables where table_schema = 'public'",
  );
  return found
    .map(({ name }) => name)
    .filter((name) => !WITHOUT_ROWS_OF_A_WORKSHOP.includes(name))
    .sort();
}

beforeAll(async () => {
  cast = await Cast.gather();
  cast.ask('builder');
  await createDesign({ name: 'Recorded' });
  await fillTables();
  const em = await entityManager();
  const [theirs] = await em.execute<{ workshop_id: string }[]>(
    'select workshop_id from memberships where user_id = ?',
    [cast.person('outsider').id],
  );
  otherWorkshop = theirs!.workshop_id;
  app = new Client({ connectionString: process.env.DATABASE_URL });
  await app.connect();
});
afterAll(() => app.end());

describe('rows of a workshop', () => {
  test('are seen from within it, in every table, and from nowhere else', async () => {
    const em = await entityManager();
    const mine: Scope = { workshop: cast.workshopId, user: cast.person('owner').id };
    const theirs: Scope = { workshop: otherWorkshop, user: cast.person('outsider').id };
    for (const table of await tablesWithRows()) {
      const [all] = await em.execute<{ count: string }[]>(`select count(*) from ${table}`);
      const seen = {
        mine: await rowsOf(table, mine),
        theirs: await rowsOf(table, theirs),
        nobody: await rowsOf(table, {}),
      };
      expect({ table, some: seen.mine > 0, nobody: seen.nobody }).toEqual({
        table,
        some: true,
        nobody: 0,
      });
      // Together they see no more than there is: no row is seen from both.
      expect({ table, sum: seen.mine + seen.theirs <= Number(all!.count) }).toEqual({
        table,
        sum: true,
      });
    }
  });

  test('can not be changed from another', async () => {
    const theirs: Scope = { workshop: otherWorkshop, user: cast.person('outsider').id };
    for (const table of ['designs', 'shop_items', 'revisions', 'cut_orders', 'memberships']) {
      const changed = await within(theirs, (tx) =>
        tx.execute(
          `update ${table} set created_at = now() where workshop_id = ? returning id`,
          [cast.workshopId],
        ),
      );
      expect({ table, changed }).toEqual({ table, changed: [] });
    }
  });

  test('can not be put there from another', async () => {
    const theirs: Scope = { workshop: otherWorkshop, user: cast.person('outsider').id };
    await expect(
      within(theirs, (tx) =>
        tx.execute(
          `insert into record_entries (at, workshop_id, who_id, what, subject, detail)
           values (now(), ?, ?, 'design-saved', ?, '{}')`,
          [cast.workshopId, cast.person('outsider').id, randomUUID()],
        ),
      ),
    ).rejects.toThrow(/row-level security/);
    await expect(
      within(theirs, (tx) =>
        tx.execute(
          `insert into memberships (id, created_at, user_id, workshop_id, role, muted_mail)
           values (?, now(), ?, ?, 'owner', '[]')`,
          [randomUUID(), cast.person('outsider').id, cast.workshopId],
        ),
      ),
    ).rejects.toThrow(/row-level security/);
  });

  test('of a scope are not left over for the next transaction', async () => {
    await rowsOf('designs', { workshop: cast.workshopId });
    expect(await rowsOf('designs', {})).toBe(0);
  });
});

describe('the application’s role', () => {
  test('is no superuser, sees through no wall and owns no table', async () => {
    const role = await app.query<Record<string, boolean>>(
      'select rolsuper, rolbypassrls, rolcreaterole, rolcreatedb from pg_roles where rolname = current_user',
    );
    expect(role.rows).toEqual([
      { rolsuper: false, rolbypassrls: false, rolcreaterole: false, rolcreatedb: false },
    ]);
    const owned = await app.query(
      'select 1 from pg_class join pg_roles r on r.oid = relowner where rolname = current_user',
    );
    expect(owned.rowCount).toBe(0);
  });

  test('finds every table with a workshop’s rows walled', async () => {
    const em = await entityManager();
    const open = await em.execute<{ name: string }[]>(
      `select relname as name from pg_class
       where relnamespace = 'public'::regnamespace and relkind = 'r' and not relrowsecurity`,
    );
    expect(open.map(({ name }) => name).sort()).toEqual(WITHOUT_ROWS_OF_A_WORKSHOP);
  });

  test.each([
    'update record_entries set at = now()',
    'delete from record_entries',
    'truncate record_entries',
    'alter table record_entries disable trigger all',
    'alter table designs disable row level security',
    'drop policy of_the_workshop on designs',
    'delete from designs',
    'update design_versions set version = 1',
    'update revision_files set name = name',
    'delete from cut_orders',
    'select * from migrations',
    'select * from graphile_worker._private_jobs',
    'set role postgres',
    'create table public.mine (id int)',
  ])('may not: %s', async (sql) => {
    await expect(app.query(sql)).rejects.toThrow(
      /permission denied|must be owner|does not exist|only takes new rows/,
    );
  });
});
