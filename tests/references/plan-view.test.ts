/** The plan view's boundary elements against exact capacitances of two conductors, over ε. */
import { describe, expect, test } from 'vitest';
import { planField, type WallElement } from '../../geometry/field/plan-view';

/** Straight elements from corner to corner, `count` to a side, metal on the left. */
function walls(
  corners: readonly (readonly [number, number])[],
  count: number,
  potential: number,
  setback = 0,
): WallElement[] {
  return corners.flatMap(([ax, ay], i) => {
    const [bx, by] = corners[(i + 1) % corners.length]!;
    // Closer together towards the corners, where the charge crowds.
    const at = (k: number): number => (1 - Math.cos((Math.PI * k) / count)) / 2;
    return Array.from({ length: count }, (_, k) => ({
      ax: ax + (bx - ax) * at(k),
      ay: ay + (by - ay) * at(k),
      bx: ax + (bx - ax) * at(k + 1),
      by: ay + (by - ay) * at(k + 1),
      potential,
      setback,
    }));
  });
}

const ring = (x: number, radius: number, sides: number): [number, number][] =>
  Array.from({ length: sides }, (_, i) => {
    const angle = (2 * Math.PI * i) / sides;
    return [x + radius * Math.cos(angle), radius * Math.sin(angle)];
  });

const square = (half: number): [number, number][] => [
  [half, half],
  [-half, half],
  [-half, -half],
  [half, -half],
];

const around = (corners: readonly (readonly [number, number])[]) => [...corners].reverse();

test('two parallel cylinders, radius 1, axes 4 apart: π/arcosh 2 (textbook, exact)', () => {
  const { energy: capacitance } = planField([
    ...walls(ring(-2, 1, 160), 1, 1),
    ...walls(ring(2, 1, 160), 1, 0),
  ]);
  expect(Math.abs(capacitance / (Math.PI / Math.acosh(2)) - 1)).toBeLessThan(5e-4);
});

// F. Bowman's formula for concentric squares, from memory; values computed from it.
describe.each([
  [2, 10.2340925693680517],
  [3, 6.2155472848594],
])('concentric squares 1 : %i', (ratio, exact) => {
  test(`C/ε = ${exact}`, () => {
    const { energy: capacitance } = planField([
      ...walls(square(1), 40, 1),
      ...walls(around(square(ratio)), 40, 0),
    ]);
    expect(Math.abs(capacitance / exact - 1)).toBeLessThan(1e-3);
  });
});

test('walls set back by s and S round a shaft: 2π/(ln 2 + s/1 + S/2)', () => {
  const { energy: capacitance } = planField([
    ...walls(ring(0, 1, 120), 1, 1, 0.1),
    ...walls(around(ring(0, 2, 120)), 1, 0, 0.2),
  ]);
  expect(Math.abs(capacitance / ((2 * Math.PI) / (Math.LN2 + 0.1 + 0.1)) - 1)).toBeLessThan(
    5e-4,
  );
});
