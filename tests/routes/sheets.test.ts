/** Files of a layout on sheets: what is refused, what they hold, and that the hashes are theirs. */

import { createHash } from 'node:crypto';
import DxfParser, { type ICircleEntity, type ILwpolylineEntity } from 'dxf-parser';
import { strFromU8, unzipSync } from 'fflate';
import { beforeAll, describe, expect, test } from 'vitest';
import { PUT as SAVE_DESIGN } from '@/app/api/designs/[id]/route';
import { POST } from '@/app/api/designs/[id]/sheets/route';
import { PUT as SAVE_ITEM } from '@/app/api/shop/[kind]/[id]/route';
import { defaultDesign, derive } from '@/geometry';
import { machineParameters, type MachineValues } from '@/geometry/cutting/shop-parameters';
import { contourBounds } from '@/geometry/measure';
import type { GivenGroup } from '@/geometry/nesting/given-layout';
import { partsOf } from '@/geometry/parts/assembly';
import { call, refusal } from '../support/call';
import { Cast } from '../support/cast';
import { auditDxf, hasEzdxf } from '../support/ezdxf';
import { rowLayout } from '../support/row-layout';

const derivation = derive(defaultDesign());
if (!derivation.ok) throw new Error('no plates');
const parts = partsOf(derivation.derived).filter((part) => part.kind === 'cut');
const room = { width: 500, height: 300, gap: 2, margin: 5 };
const KERF = 0.24;
const values = {
  ...Object.fromEntries(
    Object.entries(machineParameters).map(([key, parameter]) => [key, parameter.default]),
  ),
  kerf: KERF,
} as MachineValues;
const asked = {
  version: 1,
  machine: { from: 'values', name: 'Bench laser', values },
  copies: 1,
  settings: { gap: room.gap, margin: room.margin, rotations: 1 },
  kerf: 'compensated',
  groups: rowLayout(parts, 1, room),
};

let cast: Cast;
let id: string;
beforeAll(async () => {
  cast = await Cast.gather();
  id = await cast.design();
  cast.ask('builder');
});

const post = (change: object = {}, to = id) =>
  call(POST, { id: to }, { method: 'POST', body: { ...asked, ...change } });
const sha256 = (bytes: Uint8Array) => createHash('sha256').update(bytes).digest('hex');

async function zip(change: object = {}): Promise<Record<string, Uint8Array>> {
  const answer = await post(change);
  expect(answer.status).toBe(200);
  const entries = unzipSync(new Uint8Array(await answer.arrayBuffer()));
  return Object.fromEntries(
    Object.entries(entries).map(([path, bytes]) => [path.split('/').at(-1)!, bytes]),
  );
}

/** The first group with its placements changed. */
const placed = (change: (all: GivenGroup['placements']) => GivenGroup['placements']) => ({
  groups: asked.groups.map((group, index) =>
    index === 0 ? { ...group, placements: change(group.placements) } : group,
  ),
});

describe('what does not hold is refused and not recorded', () => {
  test.each([
    [
      'parts over each other',
      placed(([a, b, ...rest]) => [a!, { ...b!, x: a!.x + 3 }, ...rest]),
      /^Layout: parts of 0\.8 mm brass overlap/,
    ],
    [
      'parts nearer than the gap',
      { settings: { ...asked.settings, gap: 9 } },
      /come as near as .* mm, and the gap is to be 9 mm/,
    ],
    [
      'a part in the margin',
      placed(([a, ...rest]) => [{ ...a!, x: a!.x - 1 }, ...rest]),
      /is 4 mm from the edge of its sheet, and the margin is to be 5 mm/,
    ],
    [
      'a part over the edge',
      placed(([a, ...rest]) => [{ ...a!, x: a!.x - 20 }, ...rest]),
      /reaches over the edge/,
    ],
    [
      'a part missing',
      placed(([, ...rest]) => rest),
      /^Layout: rotor plate, section 1 lies there 13 times, and 14 are needed/,
    ],
    ['more capacitors than lie there', { copies: 2 }, /lies there 14 times, and 28/],
    ['a kind of sheet missing', { groups: asked.groups.slice(1) }, /is on no sheet/],
    [
      'a part of another design',
      placed(([a, ...rest]) => [{ ...a!, key: 's4-rotor' }, ...rest]),
      /“s4-rotor” is no part/,
    ],
    [
      'a sheet that is not there',
      placed(([a, ...rest]) => [{ ...a!, sheet: 7 }, ...rest]),
      /lies on sheet 8/,
    ],
    [
      'a turn that the grain forbids',
      placed(([a, ...rest]) => [{ ...a!, angle: 0.3 }, ...rest]),
      /turned by .* only steps of 360°/,
    ],
    [
      'a sheet larger than the bed',
      { machine: { ...asked.machine, values: { ...values, bedWidth: 400, bedHeight: 400 } } },
      /the bed of Bench laser is 400 mm by 400 mm/,
    ],
    [
      'two cuts that would meet',
      { machine: { ...asked.machine, values: { ...values, kerf: 2.5 } } },
      /^Gap: 2 mm is less than the kerf of 2\.5 mm/,
    ],
    [
      'a machine that cannot be',
      { machine: { ...asked.machine, values: { ...values, kerf: -1 } } },
      /^Kerf: /,
    ],
    ['a sheet alone that is none', { only: { group: 0, sheet: 9 } }, /no such sheet/],
  ])('%s', async (_, change, message) => {
    const answer = await post(change);
    expect(answer.status).toBe(422);
    expect((await refusal(answer)).message).toMatch(message);
    expect(await cast.record(id)).toEqual([]);
  });
});

describe('the files', () => {
  test('stand in the manifest with their hash, and the record names the ZIP’s', async () => {
    const own = await cast.design();
    const answer = await post({}, own);
    const body = new Uint8Array(await answer.arrayBuffer());
    expect(answer.headers.get('content-disposition')).toMatch(/_sheets_compensated\.zip"/);
    const [row, ...more] = await cast.record(own);
    expect(more).toEqual([]);
    expect(row).toMatchObject({
      what: 'file-downloaded',
      detail: { sha256: sha256(body), kerf: 'compensated', version: 1 },
    });
    expect(row!.who.id).toBe(cast.person('builder').id);
    const again = new Uint8Array(await (await post({}, own)).arrayBuffer());
    expect(sha256(again)).toBe(sha256(body));

    const held = await zip();
    const manifest = JSON.parse(strFromU8(held['manifest.json']!)) as {
      status: string;
      kerf: string;
      files: {
        file: string;
        sha256: string;
        kerf: string;
        part?: string;
        quantity?: number;
        sheet?: number;
        pieces?: { part: string; quantity: number }[];
      }[];
    };
    expect(manifest.status).toBe('Draft, not released');
    expect(manifest.kerf).toBe(
      'compensated: contours moved by half of 0.24 mm of kerf, outer out, holes in',
    );
    expect(manifest.files.map(({ file }) => file).sort()).toEqual(
      Object.keys(held)
        .filter((name) => name !== 'manifest.json')
        .sort(),
    );
    for (const { file, sha256: listed, kerf } of manifest.files) {
      expect(sha256(held[file]!)).toBe(listed);
      expect(file).toMatch(/_compensated\.(dxf|svg)$/);
      expect(kerf).toBe('compensated');
    }
    for (const { key, quantity } of parts) {
      const own = manifest.files.filter(({ part }) => part === key);
      expect(own.map((file) => file.quantity)).toEqual([quantity, quantity]);
      const lying = manifest.files
        .filter(({ sheet, file }) => sheet !== undefined && file.endsWith('.dxf'))
        .flatMap(({ pieces }) => pieces!)
        .filter(({ part }) => part === key)
        .reduce((sum, piece) => sum + piece.quantity, 0);
      expect(lying).toBe(quantity);
    }
  });

  test('have each contour larger by half the kerf outside and smaller in holes', async () => {
    const read = async (kerf: string, key: string) => {
      const held = await zip({ kerf });
      const name = Object.keys(held).find((file) =>
        new RegExp(`_${key}_.*_${kerf}\\.dxf$`).test(file),
      )!;
      const { entities } = new DxfParser().parseSync(strFromU8(held[name]!))!;
      const [outer] = entities.filter(({ layer }) => layer.endsWith('OUTER-CUT'));
      const vertices = (outer as ILwpolylineEntity).vertices.map(({ x, y, bulge }) => ({
        x,
        y,
        bulge: bulge ?? 0,
      }));
      const holes = entities.filter(
        ({ layer, type }) => layer.endsWith('INNER-CUT') && type === 'CIRCLE',
      ) as ICircleEntity[];
      return {
        bounds: contourBounds({ kind: 'path', vertices }),
        radii: holes.map(({ radius }) => radius),
      };
    };
    for (const key of ['s1-rotor', 's1-stator']) {
      const nominal = await read('nominal', key);
      const moved = await read('compensated', key);
      expect(moved.bounds.minX).toBeCloseTo(nominal.bounds.minX - KERF / 2, 5);
      expect(moved.bounds.minY).toBeCloseTo(nominal.bounds.minY - KERF / 2, 5);
      expect(moved.bounds.maxX).toBeCloseTo(nominal.bounds.maxX + KERF / 2, 5);
      expect(moved.bounds.maxY).toBeCloseTo(nominal.bounds.maxY + KERF / 2, 5);
      expect(nominal.radii.length).toBeGreaterThan(0);
      moved.radii.forEach((radius, i) =>
        expect(radius).toBeCloseTo(nominal.radii[i]! - KERF / 2, 6),
      );
    }
  });

  test('of one sheet alone are the bytes of the ZIP', async () => {
    const held = await zip({ kerf: 'nominal' });
    const answer = await post({ kerf: 'nominal', only: { group: 0, sheet: 0 } });
    const name = /filename="([^"]+)"/.exec(answer.headers.get('content-disposition')!)![1]!;
    expect(name).toMatch(/_sheet-1-of-\d_nominal\.dxf$/);
    expect(sha256(new Uint8Array(await answer.arrayBuffer()))).toBe(sha256(held[name]!));
  });

  test.runIf(hasEzdxf).each([0, 2])('pass ezdxf, with %i bridges', async (bridges) => {
    const machine = { ...asked.machine, values: { ...values, bridges } };
    const held = await zip({ machine });
    const drawings = Object.entries(held)
      .filter(([name]) => name.endsWith('.dxf'))
      .map(([name, bytes]) => ({ name, text: strFromU8(bytes) }));
    expect(drawings.length).toBeGreaterThan(4);
    for (const line of auditDxf(drawings)) expect(line).toMatch(/^0 0 4 /);
    const alone = drawings.filter(({ name }) => !name.includes('_sheet-'));
    expect(auditDxf(alone)).toEqual(alone.map(() => '0 0 4 True'));
  });

  test('of a sheet are drawn in SVG, too, cut for cut', async () => {
    const held = await zip();
    const names = Object.keys(held).filter((name) => /_sheet-1-of-.*\.svg$/.test(name));
    expect(names.length).toBe(asked.groups.length);
    const svg = strFromU8(held[names.find((name) => name.includes('brass'))!]!);
    expect(svg).toMatch(/width="500mm" height="300mm"/);
    const outer = /id="outer-cut" d="([^"]*)"/.exec(svg)![1]!;
    const [brass] = asked.groups.filter(({ material }) => material === 'brass');
    const here = brass!.placements.filter(({ sheet }) => sheet === 0);
    expect(outer.match(/z/g)).toHaveLength(here.length);
  });
});

describe('what has been saved since', () => {
  test('as a design is answered with what is stored', async () => {
    const own = await cast.design();
    cast.ask('builder');
    const body = { version: 1, name: 'Renamed since', design: defaultDesign() };
    await call(SAVE_DESIGN, { id: own }, { method: 'PUT', body });
    cast.ask('builder');
    const answer = await post({}, own);
    expect(answer.status).toBe(409);
    const said = (await answer.json()) as { current: { version: number; name: string } };
    expect(said.current).toMatchObject({ version: 2, name: 'Renamed since' });
  });

  test('as a machine is refused; as it stands it cuts', async () => {
    const laser = await cast.item('machine', 'Bench laser', values);
    const machine = { from: 'workshop', id: laser, version: 1 };
    const byId = await zip({ machine });
    const manifest = JSON.parse(strFromU8(byId['manifest.json']!)) as {
      machine: { kerf: number };
    };
    expect(manifest.machine.kerf).toBe(KERF);
    cast.ask('builder');
    const body = { name: 'Bench laser', version: 1, values: { ...values, kerf: 0.3 } };
    await call(SAVE_ITEM, { kind: 'machines', id: laser }, { method: 'PUT', body });
    cast.ask('builder');
    expect((await post({ machine })).status).toBe(409);
    expect((await post({ machine: { ...machine, id: id } })).status).toBe(404);
  });
});

test('another workshop finds neither design nor machine', async () => {
  const laser = await cast.item('machine', 'Ours', values);
  cast.ask('outsider');
  expect((await post()).status).toBe(404);
  cast.ask('builder');
  expect((await post({ machine: { from: 'workshop', id: laser, version: 1 } })).status).toBe(
    200,
  );
});
