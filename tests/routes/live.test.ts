import { Client } from 'pg';
import { afterEach, beforeAll, expect, test } from 'vitest';
import { GET } from '@/app/api/live/route';
import { Membership, User } from '@/entities';
import { defaultDesign } from '@/geometry';
import { latestChange } from '@/lib/live/latest-change';
import { saveDesign } from '@/lib/save-design';
import { entityManager } from '../support/as-owner';
import { Cast, type Caller } from '../support/cast';

let cast: Cast;
const open: AbortController[] = [];

beforeAll(async () => {
  cast = await Cast.gather();
});
afterEach(() => {
  for (const controller of open.splice(0)) controller.abort();
});

/** A screen of somebody's, and what it hears. */
async function screen(caller: Caller, since?: string) {
  cast.ask(caller);
  const controller = new AbortController();
  open.push(controller);
  const response = await GET(
    new Request(`http://127.0.0.1:3000/api/live${since ? `?since=${since}` : ''}`, {
      signal: controller.signal,
    }),
    { params: Promise.resolve({}) },
  );
  expect(response.status).toBe(200);
  expect(response.headers.get('content-type')).toContain('text/event-stream');
  const heard = { text: '', ended: false };
  const decoder = new TextDecoder();
  void (async () => {
    for await (const chunk of response.body as unknown as AsyncIterable<Uint8Array>) {
      heard.text += decoder.decode(chunk);
    }
    heard.ended = true;
  })();
  return heard;
}

async function save(id: string, version: number): Promise<void> {
  cast.ask('builder');
  const name = `Saved over ${version}`;
  await saveDesign(id, { version, name, design: defaultDesign() });
}

test('a save is heard on the workshop’s screens and on no others', async () => {
  const id = await cast.design();
  const [mine, theirs] = [await screen('machinist'), await screen('outsider')];
  await expect.poll(() => mine.text, { timeout: 2_000 }).toContain('event: again');
  await save(id, 1);
  await expect
    .poll(() => mine.text, { timeout: 2_000 })
    .toContain(`data: {"what":"design-saved","subject":"${id}","revision":null}`);
  expect(theirs.text).not.toContain(id);
});

test('what was recorded while the page was on its way is looked for', async () => {
  const id = await cast.design();
  cast.ask('owner');
  const { requireMember } = await import('@/lib/access');
  const since = await latestChange(await requireMember());
  const untouched = await screen('owner', since);
  await save(id, 1);
  const stale = await screen('owner', since);
  await expect.poll(() => stale.text, { timeout: 2_000 }).toContain('event: again');
  expect(untouched.text).not.toContain('event: again');
});

test('after the database has cut the line, screens look again and hear on', async () => {
  const id = await cast.design();
  const mine = await screen('owner');
  await save(id, 1);
  await expect.poll(() => mine.text, { timeout: 2_000 }).toContain(id);
  mine.text = '';
  const client = new Client({ connectionString: process.env.OWNER_DATABASE_URL });
  await client.connect();
  const ended = await client.query(
    "select pg_terminate_backend(pid) from pg_stat_activity where datname = current_database() and query = 'listen vaneloft_changes'",
  );
  await client.end();
  expect(ended.rowCount).toBe(1);
  await expect.poll(() => mine.text, { timeout: 5_000 }).toContain('event: again');
  await save(id, 2);
  await expect.poll(() => mine.text, { timeout: 2_000 }).toContain(id);
});

test('a stream ends with the membership, and with the session', async () => {
  const id = await cast.design();
  const [builder, machinist] = [await screen('builder'), await screen('machinist')];
  const em = await entityManager();
  await em.nativeUpdate(User, { id: cast.person('builder').id }, { sessionEpoch: 1 });
  await em.nativeUpdate(
    Membership,
    { user: cast.person('machinist').id },
    { removedAt: new Date() },
  );
  // As the routes that do these things record them.
  await em.execute(
    `insert into record_entries (at, workshop_id, who_id, what, subject, detail)
     values (now(), ?, ?, 'member-removed', ?, '{}')`,
    [cast.workshopId, cast.person('owner').id, id],
  );
  await expect.poll(() => [builder.ended, machinist.ended]).toEqual([true, true]);
});
