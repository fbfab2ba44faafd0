/** reference.json is what the solver gives, and is what README.md claims of it. */
import { describe, expect, it } from 'vitest';
import { cases, fractions } from './cases';
import { readReference } from './reference-file';
import { referenceFineness, solveOnGrid } from './solve-case';

const reference = readReference('reference.json');
const rowOf = (name: string, fraction: number) =>
  reference[name]!.rows.find((row) => row.fraction === fraction)!;
const rangeOf = (name: string) => rowOf(name, 1).capacitance - rowOf(name, 0).capacitance;

describe.each(cases)('$title', ({ name, title, shape }) => {
  it('is there, for this shape and every angle', () => {
    const kept = reference[name]!;
    expect(kept.title).toBe(title);
    expect(kept.shape).toEqual(shape);
    expect(kept.rows.map((row) => row.fraction)).toEqual(fractions);
  });

  it('is known to 0.05 % of its range', () => {
    for (const { uncertainty } of reference[name]!.rows) {
      expect(uncertainty).toBeLessThan(5e-4 * rangeOf(name));
    }
  });

  it('lies below every grid, and finer grids below coarser ones', () => {
    for (const { capacitance, onGrids } of reference[name]!.rows) {
      const falling = [...onGrids, capacitance];
      expect(falling).toEqual([...falling].sort((a, b) => b - a));
    }
  });
});

const small = cases[0]!;

describe('solved again', () => {
  it.each([0, 0.2])('the coarse grids give what is kept, %f of the travel', (fraction) => {
    const { shape, name } = small;
    const theta = fraction * shape.travel;
    const kept = rowOf(name, fraction).onGrids;
    reference[name]!.refinements.slice(0, 2).forEach((refinement, i) => {
      const again = solveOnGrid(shape, theta, referenceFineness(shape, refinement));
      expect(again).toBeCloseTo(kept[i]!, 2);
    });
  });

  it('grids of another family lead to the same limit', () => {
    const { shape, name } = small;
    const fraction = 0.2;
    const row = rowOf(name, fraction);
    const on = (refinement: number) =>
      solveOnGrid(shape, fraction * shape.travel, {
        step: 1 / 6,
        growth: 0.5,
        mostAngle: 0.3,
        box: 45,
        refinement,
      });
    const [coarse, fine] = [on(1), on(2)];
    // The order the reference itself fitted.
    const correction = (coarse - fine) / (2 ** row.order - 1);
    const doubt = row.uncertainty + 0.15 * correction;
    expect(Math.abs(fine - correction - row.capacitance)).toBeLessThan(doubt);
    expect(doubt).toBeLessThan(5e-4 * rangeOf(name));
  });

  it('a box four times as far changes nothing', () => {
    const { shape, name } = small;
    const near = referenceFineness(shape, 1);
    for (const fraction of [0, 0.2]) {
      const theta = fraction * shape.travel;
      const moved =
        solveOnGrid(shape, theta, { ...near, box: 4 * near.box }) -
        solveOnGrid(shape, theta, near);
      expect(Math.abs(moved)).toBeLessThan(5e-5 * rangeOf(name));
    }
  });
});
