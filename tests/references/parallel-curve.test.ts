/**
 * Parallel curves against Shapely 1.8.5 (GEOS), computed by it: Polygon(P).buffer(d,
 * resolution=20000).area, round joins. The polygon has sharp, blunt and concave corners and a
 * notch that a distance of 2.6 mm closes up over most of its depth. By the chords of its arcs Shapely is a little small
 * where it grows: at 80,000 chords a turn under 1e-8 mm².
 */
import { expect, test } from 'vitest';
import type { Path } from '../../geometry';
import { offsetContour } from '../../geometry/cutting/offset';
import { contourArea, contourLength } from '../../geometry/measure';

const corners = [
  [0, 0],
  [40, 0],
  [40, 8],
  [22, 8],
  [22, 11],
  [40, 14],
  [36, 30],
  [12, 26],
  [15, 14],
  [0, 20],
] as const;
const polygon: Path = {
  kind: 'path',
  vertices: corners.map(([x, y]) => ({ x, y, bulge: 0 })),
};

test('the polygon is the one that was measured', () => {
  expect(contourArea(polygon)).toBeCloseTo(874, 9);
  expect(contourLength(polygon)).toBeCloseTo(176.5965715128147, 9);
});

test.each([
  [0.05, 882.8346412568924],
  [0.1, 891.6789078761979],
  [0.5, 962.7795538792548],
  [1.2, 1088.6879902030075],
  [-0.1, 856.3901453985343],
  [-0.5, 786.9467779889518],
  [-1.2, 669.2556813578869],
])('moved by %s mm it has %s mm²', (distance, area) => {
  const { contour, closing } = offsetContour(polygon, distance);
  expect(closing).toBeNull();
  expect(contourArea(contour!)).toBeCloseTo(area, 6);
});

test('where the notch closes up, the rest is still what Shapely finds', () => {
  const { contour, closing } = offsetContour(polygon, 2.6);
  expect(contourArea(contour!)).toBeCloseTo(1336.4172281242263, 6);
  expect(closing).not.toBeNull();
  expect(closing!.width).toBeLessThan(5.2);
});
