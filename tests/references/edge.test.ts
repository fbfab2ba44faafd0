/**
 * Gains of plate edges from the kernel's cross-section solver against values from outside.
 */
import { describe, expect, test } from 'vitest';
import { prepareChain } from '../../geometry/field/cross-section';
import { edgeTable } from '../../geometry/field/edge-table';

/**
 * S. B. Cohn, "Problems in strip transmission lines", IRE Trans. MTT-2 (1954), published:
 * τ = t/b, y = 1/(1 − τ), F = (1/π)·[2y·ln(y + 1) − (y − 1)·ln(y² − 1)].
 */
function cohn(tau: number): number {
  const y = 1 / (1 - tau);
  return (2 * y * Math.log(y + 1) - (y - 1) * Math.log(y * y - 1)) / Math.PI;
}

describe('a thick edge deep between two plates (Cohn 1954)', () => {
  // Values computed from the equation.
  test.each([
    [0.1, 0.579829688662],
    [0.2, 0.691103785937],
    [0.25, 0.745874050364],
    [1 / 3, 0.839478796512],
    [0.5, 1.0490974577],
  ])('τ = %f: F = %f', (tau, factor) => {
    expect(cohn(tau)).toBeCloseTo(factor, 10);
    // Thickness in gaps: τ = t/(2g + t). The solver's own accuracy is a few 1e-4 of a gap, since
    // numbers of modes can't always be in the ratio of the heights.
    const thickness = (2 * tau) / (1 - tau);
    const table = edgeTable(thickness, 1);
    expect(Math.abs(table.rotorDeep - factor)).toBeLessThan(3e-4);
    expect(table.rotorInside(50)).toBe(table.rotorDeep);
  });

  test('rotor and stator change places with their thicknesses', () => {
    const one = edgeTable(0.5, 2);
    const other = edgeTable(2, 0.5);
    expect(one.rotorDeep).toBeCloseTo(other.statorDeep, 12);
    expect(one.rotorSetback).toBeCloseTo(other.statorSetback, 10);
    expect(one.rotorInside(0.7)).toBeCloseTo(other.statorInside(0.7), 10);
    expect(one.overlapping(0.7)).toBeCloseTo(other.overlapping(0.7), 10);
  });
});

test('flush edges: by antisymmetry an edge of τ = t/(g + t) against planes g/2 away, F·g/2', () => {
  // Follows from Cohn's formula; at t = g it is 0.5245.
  const table = edgeTable(1, 1);
  const flush = cohn(1 / 2) / 2;
  expect(flush).toBeCloseTo(0.5245, 4);
  expect(Math.abs(table.rotorInside(0) - flush)).toBeLessThan(2e-4);
  expect(Math.abs(table.statorInside(0) - flush)).toBeLessThan(2e-4);
});

/** Opposed edges, t = g, from 2-D finite differences done apart from this project, about 0.5 %. */
test.each([
  [-20, 0.096],
  [-8, 0.227],
  [-4, 0.416],
  [-2, 0.707],
  [-1, 1.053],
  [0, 1.727],
  [1, 2.675],
  [2, 3.672],
  [4, 5.672],
])('opposed edges overlapping by %f gaps: %f', (x, expected) => {
  const table = edgeTable(1, 1);
  const walls = (apart: number): number =>
    table.height / (apart + table.rotorSetback + table.statorSetback);
  const value = x > 0 ? x + table.overlapping(x) : table.apart(-x) + walls(-x);
  expect(Math.abs(value / expected - 1)).toBeLessThan(0.005);
});

test('the tail of opposed edges is that of walls set back by 0.81 of a gap together', () => {
  const { rotorSetback, statorSetback } = edgeTable(1, 1);
  expect(rotorSetback + statorSetback).toBeCloseTo(0.81, 2);
});

test('more modes change the extrapolated value by parts in a hundred thousand', () => {
  const cell = { airGap: 1, rotorThickness: 1.6, statorThickness: 0.8 };
  const at = (fineness: number): number =>
    prepareChain(
      cell,
      ['rotor', 'open', 'stator'],
      [null, null],
      fineness,
    )([Infinity, 1.3, Infinity]);
  const extrapolated = (coarse: number): number =>
    at(2 * coarse) + (at(2 * coarse) - at(coarse)) / 3;
  expect(Math.abs(extrapolated(1) / extrapolated(4) - 1)).toBeLessThan(5e-5);
});
