import { beforeAll, describe, expect, test } from 'vitest';
import { DELETE, GET, PUT } from '@/app/api/designs/[id]/route';
import { GET as LIST, POST } from '@/app/api/designs/route';
import { Design as StoredDesign } from '@/entities';
import { defaultDesign, derive, KERNEL_VERSION, type Design } from '@/geometry';
import { entityManager } from '../support/as-owner';
import { apiErrorSchema, designListSchema, designRecordSchema } from '@/lib/schemas/api';
import { call } from '../support/call';
import { Cast, storedDesign } from '../support/cast';

let cast: Cast;

beforeAll(async () => {
  cast = await Cast.gather();
});

function withGap(airGap: number): Design {
  const design = defaultDesign();
  design.sections[0]!.airGap = airGap;
  return design;
}

/** A design that the kernel can't make plates of: more capacitance than the radius has room for. */
function impossible(): Design {
  const design = defaultDesign();
  Object.assign(design.sections[0]!, { targetKind: 'terminals', maxCapacitance: 40e-9 });
  design.largestRadius = 20;
  return design;
}

const save = (id: string, version: number, design: Design, name = 'Bench section') =>
  call(PUT, { id }, { method: 'PUT', body: { version, name, design } });
const read = async (response: Response) => designRecordSchema.parse(await response.json());

describe('creating', () => {
  test('starts from the default design, checked by the kernel', async () => {
    cast.ask('builder');
    const response = await call(POST, {}, { method: 'POST', body: { name: '  First  ' } });
    const made = await read(response);
    const derivation = derive(defaultDesign());
    const findings = derivation.ok ? derivation.derived.findings : derivation.findings;
    expect(made).toMatchObject({
      name: 'First',
      state: { kind: 'draft', revision: null },
      version: 1,
      mayEdit: true,
    });
    expect(made.design).toEqual(defaultDesign());
    expect(made.kernel).toBe(KERNEL_VERSION);
    expect(made.checks.ok + made.checks.warn + made.checks.fail).toBe(findings.length);
    const [row] = await cast.record(made.id);
    expect(row).toMatchObject({ what: 'design-created', detail: { name: 'First' } });
    expect(row!.who.id).toBe(cast.person('builder').id);
  });

  test('starts from a design that is sent', async () => {
    cast.ask('owner');
    const body = { name: 'Wide', design: withGap(0.75) };
    const made = await read(await call(POST, {}, { method: 'POST', body }));
    expect(made.design.sections[0]!.airGap).toBe(0.75);
  });
});

describe('saving', () => {
  test('raises the version, keeps the values and writes what changed', async () => {
    const id = await cast.design();
    cast.ask('owner');
    const saved = await read(await save(id, 1, withGap(0.625), 'Renamed'));
    expect(saved).toMatchObject({
      version: 2,
      name: 'Renamed',
      state: { kind: 'draft', revision: null },
    });
    expect(saved.updatedBy.name).toBe(cast.person('owner').name);
    expect((await read(await call(GET, { id }))).design).toEqual(withGap(0.625));
    const [row] = await cast.record(id);
    expect(row!.detail.changes).toEqual([
      { path: 'name', from: 'Bench section', to: 'Renamed' },
      { path: 'design.sections.0.airGap', from: 0.5, to: 0.625 },
    ]);
  });

  test('over an older version is refused with what is stored', async () => {
    const id = await cast.design();
    cast.ask('owner');
    await save(id, 1, withGap(0.7));
    cast.ask('builder');
    const response = await save(id, 1, withGap(0.9));
    expect(response.status).toBe(409);
    const { error, current } = apiErrorSchema.parse(await response.json());
    expect(error.code).toBe('conflict');
    expect(error.message).toContain(cast.person('owner').name);
    expect(current).toMatchObject({ version: 2 });
    expect(designRecordSchema.parse(current).design.sections[0]!.airGap).toBe(0.7);
    expect((await read(await save(id, 2, withGap(0.9)))).version).toBe(3);
  });

  test('by two at the same moment: one is saved, the other told', async () => {
    const id = await cast.design();
    cast.ask('builder');
    const gaps = [0.6, 0.7, 0.8, 0.9];
    const answers = await Promise.all(gaps.map((gap) => save(id, 1, withGap(gap))));
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409, 409, 409]);
    expect((await storedDesign(id)).version).toBe(2);
    expect(await cast.record(id)).toHaveLength(1);
  });

  test('while another save is under way waits for it, and then is told', async () => {
    const id = await cast.design();
    cast.ask('builder');
    const em = await entityManager();
    let late: Promise<Response> | undefined;
    let settled = false;
    await em.transactional(async (tx) => {
      await tx.nativeUpdate(StoredDesign, id, { version: 2, name: 'The first' });
      late = save(id, 1, withGap(0.8)).finally(() => (settled = true));
      await new Promise((resolve) => setTimeout(resolve, 300));
      expect(settled).toBe(false);
    });
    expect((await late!).status).toBe(409);
    expect(await storedDesign(id)).toMatchObject({ version: 2, name: 'The first' });
  });

  test('what is stored already changes nothing', async () => {
    const id = await cast.design();
    cast.ask('builder');
    expect((await read(await save(id, 1, defaultDesign()))).version).toBe(1);
    expect(await cast.record(id)).toHaveLength(0);
  });

  test('a design without plates is kept, with its failures counted', async () => {
    expect(derive(impossible()).ok).toBe(false);
    const id = await cast.design();
    cast.ask('builder');
    const saved = await read(await save(id, 1, impossible()));
    expect(saved.checks.fail).toBeGreaterThan(0);
  });
});

describe('deleting', () => {
  test('takes it out of sight and keeps the row', async () => {
    const id = await cast.design();
    cast.ask('builder');
    expect((await call(DELETE, { id }, { method: 'DELETE' })).status).toBe(204);
    expect((await call(GET, { id })).status).toBe(404);
    expect((await save(id, 1, withGap(0.7))).status).toBe(404);
    expect((await call(DELETE, { id }, { method: 'DELETE' })).status).toBe(404);
    expect(await (await call(LIST, {})).text()).not.toContain(id);
    expect((await storedDesign(id)).deletedAt).toBeInstanceOf(Date);
    expect((await cast.record(id)).map(({ what }) => what)).toEqual(['design-deleted']);
  });
});

test('the list has the last changed first', async () => {
  const [first, second] = [await cast.design(), await cast.design()];
  cast.ask('builder');
  await save(first, 1, withGap(0.8));
  const { designs } = designListSchema.parse(await (await call(LIST, {})).json());
  const ids = designs.map(({ id }) => id);
  expect(ids.indexOf(first)).toBeLessThan(ids.indexOf(second));
  expect(designs[0]!.laws).toEqual(['frequency']);
});
