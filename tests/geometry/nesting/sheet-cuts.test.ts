import { describe, expect, test } from 'vitest';
import { startingMachines, sheetsFor } from '../../../geometry/cutting/starting-values';
import { distanceToSides, sidesOf, type Side } from '../../../geometry/cutting/side';
import { contourArea } from '../../../geometry/measure';
import { layOut } from '../../../geometry/nesting/lay-out';
import { placedContour } from '../../../geometry/nesting/placed';
import { sheetCuts } from '../../../geometry/nesting/sheet-cuts';
import { partsOf } from '../../../geometry/parts/assembly';
import { examplesDerived } from '../../support/example-plates';

const { derived } = examplesDerived()[0]!;
const parts = partsOf(derived).filter((part) => part.kind === 'cut');

describe.each(startingMachines)('$name', (machine) => {
  const job = {
    parts,
    copies: 1,
    machine,
    sheets: sheetsFor(parts, { width: 300, height: 200, count: 9 }),
    settings: { gap: machine.leadIn + 2 * machine.kerf + 0.5, margin: 8, rotations: 2 },
    kerf: 'compensated' as const,
  };
  const { groups } = layOut(job)!;

  test('every part is cut, and no lead-in runs into the next', () => {
    let cut = 0;
    for (const group of groups) {
      const known = new Map(group.parts.map((part) => [part.key, part]));
      group.layout.sheets.forEach((_, sheet) => {
        const cuts = sheetCuts(group, sheet, machine, 'compensated');
        cut += cuts.length;
        const edges = cuts.map(({ placement }): Side[] =>
          sidesOf(placedContour(known.get(placement.key)!.outside, placement)),
        );
        cuts.forEach(({ runs }, own) => {
          for (const { leadIn, edge } of runs) {
            if (!leadIn || edge === 'inner') continue;
            edges.forEach((sides, other) => {
              const away = distanceToSides(sides, leadIn.from);
              // From its own part at least the lead-in; from others half a cut and more.
              if (other === own) expect(away).toBeGreaterThan(0.99 * machine.leadIn);
              else expect(away).toBeGreaterThan(machine.kerf / 2);
            });
          }
        });
      });
    }
    expect(cut).toBe(parts.reduce((sum, { quantity }) => sum + quantity, 0));
  });

  test('turning and moving keep the size of every cut, and its order', () => {
    for (const group of groups) {
      const cuts = sheetCuts(group, 0, machine, 'nominal');
      for (const { placement, runs } of cuts) {
        const part = group.parts.find(({ key }) => key === placement.key)!;
        const edges = runs.map(({ edge }) => edge);
        expect(edges).toEqual([...edges].sort());
        for (const [i, hole] of part.holes.entries()) {
          expect(contourArea(runs[i]!.contour!)).toBeCloseTo(contourArea(hole), 6);
        }
        const outer = runs.at(-1)!.contour;
        if (outer) expect(contourArea(outer)).toBeCloseTo(contourArea(part.outside), 6);
      }
      const xs = cuts.map(({ placement }) => placement.x);
      expect(xs).toEqual([...xs].sort((a, b) => a - b));
    }
  });
});
