/**
 * The four laws between 40 and 400 pF over 180°, n = 20, g = 0.5 mm, rc = 10 mm, εr = 1, area term
 * alone. Laws: E. A. Kolster, Bull. Bur. Standards 11 (1914), from memory. Table: computed from
 * the equations of the laws, outside this project's code.
 */
import { describe, expect, test } from 'vitest';
import { EPSILON_0 } from '../../geometry/constants';
import { lawBetween, type NamedLaw } from '../../geometry/law';
import { BLADE_STEPS, firstBlade } from '../../geometry/solve-blade';

const GAPS = 20;
const GAP = 0.5;
const CUTOUT = 10;

/** Radius in mm and total in pF at 0°, 90° and 180°. */
const table: Record<NamedLaw, [number, number][]> = {
  capacitance: [
    [27.3332, 40],
    [27.3332, 220],
    [27.3332, 400],
  ],
  wavelength: [
    [20.2716, 40],
    [27.3332, 173.2456],
    [32.9131, 400],
  ],
  frequency: [
    [14.0829, 40],
    [21.0941, 92.3545],
    [56.6513, 400],
  ],
  logarithmic: [
    [16.2959, 40],
    [24.9707, 126.4911],
    [41.8995, 400],
  ],
};

/** ∫ (r² − rc²)/2 dφ by Simpson's rule. */
function sweptArea(radius: Float64Array, travel: number): number {
  const steps = radius.length - 1;
  let sum = 0;
  radius.forEach((r, i) => {
    const weight = i === 0 || i === steps ? 1 : i % 2 === 1 ? 4 : 2;
    sum += (weight * (r * r - CUTOUT * CUTOUT)) / 2;
  });
  return (sum * travel) / steps / 3;
}

describe.each(Object.entries(table) as [NamedLaw, [number, number][]][])('%s', (name, rows) => {
  const law = lawBetween(name, 40e-12, 400e-12);
  const blade = firstBlade(
    {
      wanted: (angle) => law.slope(angle / Math.PI) / Math.PI / (EPSILON_0 * GAPS),
      from: 0,
      to: Math.PI,
      rotorSector: Math.PI,
      statorSector: Math.PI,
      airGap: GAP,
      cutoutRadius: CUTOUT,
      edgeOffset: 0,
      leastRadius: 0,
    },
    0,
  );

  test.each([0, 1, 2])('radius and total at row %i', (row) => {
    const [radius, total] = rows[row]!;
    expect(blade.radius[(row * BLADE_STEPS) / 2]).toBeCloseTo(radius, 4);
    expect(law.total(row / 2) * 1e12).toBeCloseTo(total, 4);
  });

  test('swept area g·ΔC/(ε·n) = 1016.46816 mm²', () => {
    expect(sweptArea(blade.radius, Math.PI)).toBeCloseTo(1016.46816, 4);
  });

  test.each([0.1, 0.5, 0.9])('the slope is the derivative of the total at %f', (x) => {
    const h = 1e-4;
    const slope = (law.total(x + h) - law.total(x - h)) / (2 * h);
    expect(law.slope(x) / slope).toBeCloseTo(1, 6);
  });
});
