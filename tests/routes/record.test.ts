import { beforeAll, expect, test } from 'vitest';
import { GET } from '@/app/api/record/route';
import { GET as EXPORT } from '@/app/api/record/export/route';
import { defaultDesign } from '@/geometry';
import { createDesign } from '@/lib/create-design';
import { saveDesign } from '@/lib/save-design';
import { recordPageSchema, type RecordPage } from '@/lib/schemas/record';
import { call, refusal } from '../support/call';
import { Cast } from '../support/cast';

let cast: Cast;
let designId: string;

beforeAll(async () => {
  cast = await Cast.gather();
  cast.ask('builder');
  designId = (await createDesign({ name: '=2+3 bench' })).id;
  await saveDesign(designId, { version: 1, name: 'Second name', design: defaultDesign() });
  cast.ask('owner');
  await createDesign({ name: 'Of the owner' });
});

async function ask(query: Record<string, string> = {}): Promise<RecordPage> {
  const answer = await call(GET, {}, { query });
  expect(answer.status).toBe(200);
  return recordPageSchema.parse(await answer.json());
}

test('says who did what to which, newest first, with what changed', async () => {
  cast.ask('builder');
  const { rows, more } = await ask();
  expect(more).toBe(false);
  expect(rows.map(({ who, what, subject }) => [who.name, what, subject.name])).toEqual([
    ['Test owner', 'design-created', 'Of the owner'],
    ['Test builder', 'design-saved', 'Second name'],
    ['Test builder', 'design-created', 'Second name'],
  ]);
  expect(rows[1]!.facts).toContainEqual(['name', '=2+3 bench → Second name']);
});

test('filters by person, deed, subject and time, and pages', async () => {
  cast.ask('owner');
  expect((await ask({ who: cast.person('owner').id })).rows).toHaveLength(1);
  expect((await ask({ what: 'design-saved' })).rows).toHaveLength(1);
  const ofOne = (await ask({ subject: designId })).rows;
  expect(ofOne).toHaveLength(2);
  expect((await ask({ before: ofOne[0]!.id, subject: designId })).rows).toEqual([ofOne[1]]);
  const then = ofOne[0]!.at;
  expect((await ask({ from: then, subject: designId })).rows.length).toBeGreaterThan(0);
  expect((await ask({ until: '2000-01-01T00:00:00Z' })).rows).toEqual([]);
});

test('a filter that makes no sense is named', async () => {
  cast.ask('owner');
  const answer = await call(GET, {}, { query: { from: 'yesterday' } });
  expect(answer.status).toBe(422);
  expect((await refusal(answer)).message).toMatch(/^From: not a moment/);
});

test('another workshop sees none of it', async () => {
  cast.ask('outsider');
  expect((await ask()).rows).toEqual([]);
  expect((await ask({ subject: designId })).rows).toEqual([]);
});

test('the export holds the same rows, and no formulas', async () => {
  cast.ask('builder');
  const csv = await (await call(EXPORT, {})).text();
  const lines = csv.trim().split('\r\n');
  expect(lines).toHaveLength(4);
  expect(lines[0]).toBe('Row,At (UTC),Who,Did,To,Revision,Detail');
  // A cell that begins with = would be reckoned by a spreadsheet (OWASP, CSV injection).
  expect(csv).not.toMatch(/(^|,|\n)"?=/);
});
