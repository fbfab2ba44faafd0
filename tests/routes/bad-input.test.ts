import { beforeAll, describe, expect, test } from 'vitest';
import { DELETE, GET, PUT } from '@/app/api/designs/[id]/route';
import { GET as FILES } from '@/app/api/designs/[id]/files/route';
import { POST as NAME } from '@/app/api/designs/[id]/revisions/route';
import { POST } from '@/app/api/designs/route';
import { defaultDesign } from '@/geometry';
import { call, refusal } from '../support/call';
import { Cast } from '../support/cast';

let cast: Cast;

beforeAll(async () => {
  cast = await Cast.gather();
});

const post = (options: Parameters<typeof call>[2]) => {
  cast.ask('builder');
  return call(POST, {}, { method: 'POST', ...options });
};

describe('an id that is none', () => {
  const ids = ['', '1', 'null', "' or 1=1 --", '../designs', 'é', '0'.repeat(5_000), '\0'];
  test.each(ids)('%j is not found', async (id) => {
    cast.ask('owner');
    const body = { version: 1, name: 'x', design: defaultDesign() };
    const answers = [
      await call(GET, { id }),
      await call(FILES, { id }),
      await call(DELETE, { id }, { method: 'DELETE' }),
      await call(PUT, { id }, { method: 'PUT', body }),
      await call(NAME, { id }, { method: 'POST', body: { version: 1, name: 'First' } }),
    ];
    expect(answers.map(({ status }) => status)).toEqual([404, 404, 404, 404, 404]);
  });
});

describe('a body that is not taken', () => {
  test.each([
    ['not JSON', { raw: '{"name": ' }, 'not JSON'],
    ['nothing', { raw: '' }, 'not JSON'],
    [
      'another type',
      { raw: '{"name":"x"}', headers: { 'content-type': 'text/plain' } },
      'JSON',
    ],
    ['a null character', { body: { name: 'a\0b' } }, 'null character'],
    ['nested without end', { raw: '['.repeat(30_000) + ']'.repeat(30_000) }, '16 levels'],
    ['too large', { body: { name: 'x', pad: 'x'.repeat(70_000) } }, 'larger than 64 kB'],
  ])('%s', async (_what, options, words) => {
    const response = await post(options);
    expect(response.status).toBe(422);
    const error = await refusal(response);
    expect(error.code).toBe('bad-input');
    expect(error.message).toContain(words);
  });

  test('too large with a header that says it is small', async () => {
    const response = await post({
      raw: JSON.stringify({ name: 'x'.repeat(70_000) }),
      headers: { 'content-length': '10' },
    });
    expect((await refusal(response)).message).toContain('larger than 64 kB');
  });
});

describe('a value that is not taken is named with its field and range', () => {
  function changed(change: (design: Record<string, unknown>) => void): unknown {
    const design = defaultDesign() as unknown as Record<string, unknown>;
    change(design);
    return design;
  }
  const section = (values: Record<string, unknown>) =>
    changed(({ sections }) => Object.assign((sections as object[])[0]!, values));

  test.each([
    [{ name: ' ' }, 'name', 'empty'],
    [{ name: 'x'.repeat(81) }, 'name', '80'],
    [{ design: section({ airGap: -0.2 }) }, 'design.sections.0.airGap', '-0.2 mm'],
    [{ design: section({ airGap: '0.5' }) }, 'design.sections.0.airGap', 'not a number'],
    [{ design: section({ rotorPlates: 2.5 }) }, 'design.sections.0.rotorPlates', '2.5'],
    [{ design: section({ law: 'cubic' }) }, 'design.sections.0.law', 'cubic'],
    [{ design: section({ colour: 'red' }) }, 'design.sections.0.colour', 'colour'],
    [{ design: changed((design) => delete design.travel) }, 'design.travel', 'nothing'],
    [{ design: changed((design) => (design.sections = [])) }, 'design.sections', '1 to 4'],
    [{ design: null }, 'design', 'Design'],
    [{ design: 7 }, 'design', 'Design'],
  ])('%j', async (change, field, words) => {
    const response = await post({ body: { name: 'Bad', ...change } });
    expect(response.status).toBe(422);
    const error = await refusal(response);
    expect(error).toMatchObject({ code: 'bad-input', field });
    expect(error.message).toContain(words);
  });

  test('so is a version or a name of a revision', async () => {
    const id = await cast.design();
    cast.ask('builder');
    const name = async (body: unknown) =>
      refusal(await call(NAME, { id }, { method: 'POST', body }));
    expect(await name({ version: '1', name: 'First' })).toMatchObject({ field: 'version' });
    expect(await name({ version: 1, name: ' ' })).toMatchObject({ field: 'name' });
    expect(await name([])).toMatchObject({ code: 'bad-input' });
  });
});

describe('a write from a page of another site', () => {
  test.each([
    [{ origin: 'https://elsewhere.example' }],
    [{ origin: 'null' }],
    [{ origin: 'http://127.0.0.1:3001' }],
    [{ 'sec-fetch-site': 'cross-site' }],
  ])('%j is refused', async (headers: Record<string, string>) => {
    const response = await post({ body: { name: 'Foreign' }, headers });
    expect(response.status).toBe(403);
  });

  test.each([
    [{ origin: 'http://127.0.0.1:3000', 'sec-fetch-site': 'same-origin' }],
    [{ 'sec-fetch-site': 'same-origin' }],
  ])('%j is our own', async (headers: Record<string, string>) => {
    expect((await post({ body: { name: 'Own' }, headers })).status).toBe(201);
  });
});
