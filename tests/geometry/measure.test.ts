import { expect, test } from 'vitest';
import { flatten } from '../../geometry/flatten';
import {
  contourArea,
  contourBounds,
  contourLength,
  contourReach,
} from '../../geometry/measure';
import { derive, defaultDesign, type Contour, type Path } from '../../geometry';

const square: Path = {
  kind: 'path',
  vertices: [
    { x: 1, y: 1, bulge: 0 },
    { x: 4, y: 1, bulge: 0 },
    { x: 4, y: 4, bulge: 0 },
    { x: 1, y: 4, bulge: 0 },
  ],
};

/** A half disc of radius 5 whose flat side lies along x. */
const halfDisc: Path = {
  kind: 'path',
  vertices: [
    { x: 5, y: 0, bulge: 1 },
    { x: -5, y: 0, bulge: 0 },
  ],
};

test('square', () => {
  expect(contourArea(square)).toBe(9);
  expect(contourLength(square)).toBe(12);
  expect(contourReach(square)).toBeCloseTo(Math.hypot(4, 4), 12);
  expect(contourBounds(square)).toEqual({ minX: 1, minY: 1, maxX: 4, maxY: 4 });
});

test('half disc', () => {
  expect(contourArea(halfDisc)).toBeCloseTo((Math.PI * 25) / 2, 12);
  expect(contourLength(halfDisc)).toBeCloseTo(Math.PI * 5 + 10, 12);
  expect(contourReach(halfDisc)).toBeCloseTo(5, 12);
  const bounds = contourBounds(halfDisc);
  expect(bounds.maxY).toBeCloseTo(5, 12);
  expect(bounds.minY).toBeCloseTo(0, 12);
});

test('circle', () => {
  const hole: Contour = { kind: 'circle', x: 3, y: 4, radius: 2 };
  expect(contourArea(hole)).toBeCloseTo(4 * Math.PI, 12);
  expect(contourReach(hole)).toBe(7);
});

test('a flattened outline keeps its area', () => {
  const derivation = derive(defaultDesign());
  if (!derivation.ok) throw new Error('no plates');
  for (const { outside } of Object.values(derivation.derived.sections[0]!).filter(isPlate)) {
    const flat = flatten(outside, 0.02);
    let area = 0;
    for (let i = 0; i < flat.length; i += 2) {
      const [x, y] = [flat[i]!, flat[i + 1]!];
      const [nx, ny] = [flat[(i + 2) % flat.length]!, flat[(i + 3) % flat.length]!];
      area += (x * ny - nx * y) / 2;
    }
    expect(area / contourArea(outside)).toBeCloseTo(1, 9);
  }
});

function isPlate(value: unknown): value is { outside: Path } {
  return typeof value === 'object' && value !== null && 'outside' in value;
}
