/**
 * The kernel's field model against three-dimensional finite differences, which share no code
 * with it (tests/field; refined by Richardson's extrapolation, method and uncertainties in its
 * README): the cell of an endless stack, and short stacks with open end faces. Bounds: 0.2 % of
 * the range from 50 gaps to the rim on, 0.5 % at 20, the open position included.
 */
import { describe, expect, test } from 'vitest';
import reference from '../field/reference.json';
import shortStacks from '../field/short-stack.json';
import type { StackShape } from '../field/stack-shape';
import { compositeOf } from '../support/composite';

interface Row {
  readonly fraction: number;
  readonly capacitance: number;
}

type Solved = [string, { title: string; shape: StackShape; rows: Row[] }];

const endless = Object.entries(reference) as unknown as Solved[];
const short = Object.entries(shortStacks) as unknown as Solved[];

test('at least five geometries, and short stacks with and without posts', () => {
  expect(endless.length).toBeGreaterThanOrEqual(5);
  expect(short.some(([, { shape }]) => !shape.posts)).toBe(true);
  expect(short.some(([, { shape }]) => shape.posts)).toBe(true);
});

describe.each([
  ['halfCell', endless],
  ['shortStack', short],
] as const)('%s', (what, solved) => {
  describe.each(solved)('%s', (_name, { shape, rows }) => {
    const values = compositeOf(
      shape,
      rows.map((row) => row.fraction),
    )[what];
    const range = rows.at(-1)!.capacitance - rows[0]!.capacitance;
    const bound = shape.rotor.radius / shape.gap >= 50 ? 0.002 : 0.005;

    test('nine angles, from open to meshed', () => {
      expect(rows.length).toBe(9);
      expect(rows[0]!.fraction).toBe(0);
      expect(rows.at(-1)!.fraction).toBe(1);
    });

    test.each(rows.map((row, i) => [row.fraction, i] as const))(
      `at %f of the travel within ${100 * bound} %% of the range`,
      (_fraction, i) => {
        expect(Math.abs(values[i]! - rows[i]!.capacitance) / range).toBeLessThan(bound);
      },
    );
  });
});
