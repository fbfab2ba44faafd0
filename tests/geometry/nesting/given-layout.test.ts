/** A layout sent back is what it was, or is refused. */

import { describe, expect, test } from 'vitest';
import { defaultDesign, derive } from '../../../geometry';
import { sheetsFor, startingMachines } from '../../../geometry/cutting/starting-values';
import { sheetCutFiles } from '../../../geometry/files/sheet-files';
import { heldLayout, type GivenLayout } from '../../../geometry/nesting/given-layout';
import { layOut } from '../../../geometry/nesting/lay-out';
import { partsOf } from '../../../geometry/parts/assembly';

const derivation = derive(defaultDesign(), { model: 'edges' });
if (!derivation.ok) throw new Error('no plates');
const parts = partsOf(derivation.derived).filter((part) => part.kind === 'cut');
const machine = startingMachines[0]!;
const settings = { gap: 2, margin: 5, rotations: 2 };
const laid = layOut({
  parts,
  machine,
  copies: 2,
  kerf: 'compensated',
  sheets: sheetsFor(parts, { width: 300, height: 200, count: 8 }),
  settings,
})!;
const given = JSON.parse(
  JSON.stringify({
    machine,
    copies: 2,
    settings,
    kerf: 'compensated',
    groups: laid.groups.map(({ material, thickness, layout: { sheets, placements } }) => ({
      material,
      thickness,
      sheets,
      placements,
    })),
  }),
) as GivenLayout;

describe('a layout of the nesting', () => {
  const held = heldLayout(parts, given);

  test('holds as it was sent, on more than one sheet', () => {
    expect(held.map(({ tally }) => tally.pierces)).toEqual(
      laid.groups.map(({ tally }) => tally.pierces),
    );
    expect(held.map(({ layout }) => layout.nearest)).toEqual(
      laid.groups.map(({ layout }) => layout.nearest),
    );
    expect(Math.max(...held.map(({ layout }) => layout.sheets.length))).toBeGreaterThan(1);
  });

  test('gives every file a name of its own, and counts every piece', () => {
    const files = sheetCutFiles({ design: 'Try', revision: '3' }, held, given);
    expect(new Set(files.map(({ name }) => name)).size).toBe(files.length);
    for (const { key, quantity } of parts) {
      const lying = files
        .filter(({ sheet, kind }) => sheet !== null && kind === 'dxf')
        .flatMap(({ pieces }) => pieces)
        .filter(({ part }) => part === key)
        .reduce((sum, piece) => sum + piece.quantity, 0);
      expect(lying).toBe(2 * quantity);
    }
  });
});

test('a kerf that closes a hole is refused where it is compensated for', () => {
  const wide = {
    ...given,
    machine: { ...machine, kerf: 3.5 },
    settings: { ...settings, gap: 4 },
  };
  expect(() => heldLayout(parts, wide)).toThrow(/^Kerf: .* closes it up/);
});
