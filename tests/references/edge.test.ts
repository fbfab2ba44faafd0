/**
 * Gain of a thick edge between two large plates: S. B. Cohn, "Problems in strip transmission
 * lines", IRE Trans. MTT-2 (1954), published. Values computed from the equation; at τ = 0 the
 * closed form 2·ln2/π.
 */
import { expect, test } from 'vitest';
import { edgeFactor, edgeFactorBetween } from '../../geometry/edge';

test.each([
  [0, 0.441271200305],
  [0.1, 0.579829688662],
  [0.2, 0.691103785937],
  [0.25, 0.745874050364],
  [1 / 3, 0.839478796512],
  [0.5, 1.0490974577],
])('F(%f) = %f', (tau, factor) => {
  expect(edgeFactor(tau)).toBeCloseTo(factor, 10);
});

test('a thin edge gives 2·ln2/π', () => {
  expect(edgeFactor(0)).toBeCloseTo((2 * Math.LN2) / Math.PI, 14);
  expect(edgeFactor(1e-12)).toBeCloseTo((2 * Math.LN2) / Math.PI, 9);
});

test('sheet as thick as the gap is wide has τ = 1/3', () => {
  expect(edgeFactorBetween(0.5, 0.5)).toBeCloseTo(0.839478796512, 10);
});
