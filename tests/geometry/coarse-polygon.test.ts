/** Polygons with the corners that matter at a distance. */
import { expect, test } from 'vitest';
import { coarsePolygon } from '../../geometry/coarse-polygon';

/** Corners along the sides of a square of 10 mm, off them by turns. */
function ruffledSquare(off: number): number[] {
  const corners = [0, 0, 10, 0, 10, 10, 0, 10];
  return Array.from({ length: 4 }, (_, side) => {
    const [ax, ay] = [corners[2 * side]!, corners[2 * side + 1]!];
    const [dx, dy] = [corners[(2 * side + 2) % 8]! - ax, corners[(2 * side + 3) % 8]! - ay];
    return Array.from({ length: 50 }, (_, i) => {
      const out = i === 0 ? 0 : i % 2 === 0 ? off : -off;
      return [ax + (dx * i) / 50 + (dy / 10) * out, ay + (dy * i) / 50 - (dx / 10) * out];
    }).flat();
  }).flat();
}

test('fine waves go, corners stay', () => {
  expect(coarsePolygon(ruffledSquare(0.01), 0.02)).toEqual([0, 0, 10, 0, 10, 10, 0, 10]);
});

test('waves that are no finer than the tolerance stay', () => {
  expect(coarsePolygon(ruffledSquare(0.05), 0.02)).toHaveLength(2 * 200);
});

test('a needle there and back is no straight side', () => {
  const needle = [0, 0, 5, 0, 5, 8, 5, 0.001, 10, 0, 5, -10];
  expect(coarsePolygon(needle, 0.02)).toEqual(needle);
});
