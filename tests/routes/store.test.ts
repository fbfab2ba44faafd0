/** Machines and sheet of a workshop: what saving keeps, refuses and writes into the record. */

import { beforeAll, describe, expect, test } from 'vitest';
import { DELETE, PUT } from '@/app/api/shop/[kind]/[id]/route';
import { GET, POST } from '@/app/api/shop/[kind]/route';
import type { Parameter } from '@/geometry/parameters';
import { machineParameters, sheetParameters } from '@/geometry/cutting/shop-parameters';
import { apiErrorSchema } from '@/lib/schemas/api';
import { shopItemSchema, shopItemsSchema, type ShopKind } from '@/lib/schemas/shop';
import { call, refusal } from '../support/call';
import { Cast } from '../support/cast';

let cast: Cast;

beforeAll(async () => {
  cast = await Cast.gather();
});

const startOf = (parameters: Record<string, Parameter>) =>
  Object.fromEntries(
    Object.entries(parameters).map(([key, { default: start }]) => [key, start]),
  );
const starts = { machines: startOf(machineParameters), sheets: startOf(sheetParameters) };
const read = async (response: Response) => shopItemSchema.parse(await response.json());
const refused = async (response: Response) => (await refusal(response)).message;
const make = async (kind: ShopKind, values: object = starts[kind]) =>
  read(await call(POST, { kind }, { method: 'POST', body: { name: 'By the door', values } }));
const save = (kind: ShopKind, id: string, body: unknown) =>
  call(PUT, { kind, id }, { method: 'PUT', body });

describe('saving a machine', () => {
  test('raises the version and writes what changed', async () => {
    cast.ask('builder');
    const made = await make('machines');
    cast.ask('owner');
    const values = { ...made.values, kerf: 0.21 };
    const saved = await read(
      await save('machines', made.id, { name: made.name, version: 1, values }),
    );
    expect(saved).toMatchObject({ version: 2, values: { kerf: 0.21 } });
    expect(saved.updatedBy.id).toBe(cast.person('owner').id);
    const [, row] = await cast.record(made.id);
    expect(row).toMatchObject({
      what: 'item-saved',
      detail: {
        changes: [{ path: 'values.kerf', from: starts.machines.kerf, to: 0.21 }],
      },
    });
  });

  test('as it is stored changes nothing', async () => {
    cast.ask('builder');
    const made = await make('machines');
    const { name, version, values } = made;
    expect(await read(await save('machines', made.id, { name, version, values }))).toEqual(
      made,
    );
    expect(await cast.record(made.id)).toHaveLength(1);
  });

  test('over an older version is refused, names who was first, and keeps theirs', async () => {
    cast.ask('builder');
    const { id, name, values } = await make('machines');
    cast.ask('owner');
    await save('machines', id, { name, version: 1, values: { ...values, kerf: 0.3 } });
    cast.ask('builder');
    const late = await save('machines', id, { name, version: 1, values });
    expect(late.status).toBe(409);
    const { error, current } = apiErrorSchema.parse(await late.json());
    expect(error.message).toContain(cast.person('owner').name);
    expect(current).toMatchObject({ id, version: 2, values: { kerf: 0.3 } });
    const list = shopItemsSchema.parse(
      await (await call(GET, { kind: 'machines' }, {})).json(),
    );
    expect(list.items.find((item) => item.id === id)).toMatchObject({
      version: 2,
      values: { kerf: 0.3 },
    });
  });

  test.each([
    ['kerf', -1, 'Kerf'],
    ['kerf', 'wide', 'Kerf'],
    ['bridges', 2.5, 'Micro-bridges in an outer contour'],
    ['process', 'teeth', 'Process'],
  ])('with %s of %s is refused by its name', async (field, value, label) => {
    cast.ask('builder');
    const { id, name, values } = await make('machines');
    const wrong = { name, version: 1, values: { ...values, [field]: value } };
    const response = await save('machines', id, wrong);
    expect(response.status).toBe(422);
    expect(await refused(response)).toMatch(new RegExp(`^${label}: `));
    expect(await cast.record(id)).toHaveLength(1);
  });

  test('without the version that was opened is refused', async () => {
    cast.ask('builder');
    const { id, name, values } = await make('machines');
    const response = await save('machines', id, { name, values });
    expect(response.status).toBe(422);
    expect(await refused(response)).toMatch(/^Version: missing/);
  });
});

describe('what is not there', () => {
  test('is named for what it was to be', async () => {
    cast.ask('builder');
    const machine = await make('machines');
    const body = { name: 'Other', version: 1, values: starts.sheets };
    // A machine is no sheet, whoever asks.
    const response = await save('sheets', machine.id, body);
    expect(response.status).toBe(404);
    expect(await refused(response)).toMatch(/^No such sheet/);
    expect((await call(GET, { kind: 'lathes' }, {})).status).toBe(404);
  });

  test('stays away once deleted', async () => {
    cast.ask('builder');
    const { id, name, values } = await make('sheets');
    expect((await call(DELETE, { kind: 'sheets', id }, { method: 'DELETE' })).status).toBe(204);
    expect((await save('sheets', id, { name, version: 1, values })).status).toBe(404);
    const list = shopItemsSchema.parse(await (await call(GET, { kind: 'sheets' }, {})).json());
    expect(list.items.map((item) => item.id)).not.toContain(id);
  });
});
