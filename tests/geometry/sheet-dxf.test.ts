/** The DXF of a laid-out sheet, read back by a reader of another's making. */
import DxfParser, { type ICircleEntity, type ILwpolylineEntity } from 'dxf-parser';
import { describe, expect, test } from 'vitest';
import { defaultDesign, derive } from '../../geometry';
import { sheetsFor, startingMachines } from '../../geometry/cutting/starting-values';
import { sheetDxf } from '../../geometry/files/sheet-dxf';
import { contourArea } from '../../geometry/measure';
import { layOut } from '../../geometry/nesting/lay-out';
import { partsOf } from '../../geometry/parts/assembly';

const derivation = derive(defaultDesign(), { model: 'edges' });
if (!derivation.ok) throw new Error('no plates');
const parts = partsOf(derivation.derived).filter((part) => part.kind === 'cut');
const [machine] = startingMachines;

describe.each(['nominal', 'compensated'] as const)('%s', (kerf) => {
  const laid = layOut({
    parts,
    machine: machine!,
    copies: 1,
    kerf,
    sheets: sheetsFor(parts, { width: 500, height: 300, count: 4 }),
    settings: { gap: 2, margin: 5, rotations: 4 },
  })!;
  const group = laid.groups.find(({ material }) => material === 'brass')!;
  const text = sheetDxf(group, 0, machine!, kerf);
  const dxf = new DxfParser().parseSync(text)!;
  const on = (layer: string) => dxf.entities.filter((entity) => entity.layer === layer);
  const here = group.layout.placements.filter(({ sheet }) => sheet === 0);

  test('every part has one closed outer cut and its holes, nothing else is cut', () => {
    const outer = on('OUTER-CUT') as ILwpolylineEntity[];
    expect(outer).toHaveLength(here.length);
    expect(outer.every(({ shape }) => shape)).toBe(true);
    const holes = here.reduce(
      (sum, { key }) => sum + group.parts.find((part) => part.key === key)!.holes.length,
      0,
    );
    expect(on('INNER-CUT')).toHaveLength(holes);
    expect(on('NOTES').length).toBe(1);
    expect(new Set(dxf.entities.map(({ layer }) => layer))).toEqual(
      new Set(['OUTER-CUT', 'INNER-CUT', 'LEAD-IN', 'MARKING', 'NOTES']),
    );
  });

  test('areas are the parts’ own, or grown by the kerf: A + P·k/2 and corners (Steiner)', () => {
    const total = (on('OUTER-CUT') as ILwpolylineEntity[]).reduce(
      (sum, { vertices }) =>
        sum +
        contourArea({
          kind: 'path',
          vertices: vertices.map(({ x, y, bulge }) => ({ x, y, bulge: bulge ?? 0 })),
        }),
      0,
    );
    const own = here.reduce(
      (sum, { key }) =>
        sum + contourArea(group.parts.find((part) => part.key === key)!.outside),
      0,
    );
    if (kerf === 'nominal') expect(total / own).toBeCloseTo(1, 6);
    else expect(total).toBeGreaterThan(own * 1.001);
    const bore = (on('INNER-CUT') as ICircleEntity[]).map(({ radius }) => radius);
    const smaller = kerf === 'nominal' ? 0 : machine!.kerf / 2;
    expect(bore.some((radius) => Math.abs(radius - (3 - smaller)) < 1e-6)).toBe(true);
  });

  test('the same layout gives the same bytes, and says its kerf', () => {
    expect(sheetDxf(group, 0, machine!, kerf)).toBe(text);
    expect(text).toContain(kerf === 'nominal' ? 'no kerf allowed for' : 'mm of kerf');
  });
});
