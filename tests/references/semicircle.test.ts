/**
 * Semicircular plates, C = ε·n·(π/2)(r1² − r2²)/g.
 * Form: National Bureau of Standards Circular 74, "Radio Instruments and Measurements"
 * (1918/1924), C[µµF] = 0.1390·K·(N − 1)(r1² − r2²)/τ, lengths in cm — published, from memory.
 * Coefficient 0.139081257 and 292.070640 pF: computed from ε0 of CODATA 2022.
 */
import { expect, test } from 'vitest';
import { EPSILON_0 } from '../../geometry/constants';
import { overlapAt } from '../../geometry/overlap';
import { arcVertices } from '../../geometry/polar';
import type { Path } from '../../geometry';

/** Half a ring, from angle `from` counter-clockwise over half a turn. */
function halfRing(outer: number, inner: number, from: number): Path {
  const outside = arcVertices(outer, from, Math.PI);
  const corner = (radius: number) => ({
    x: radius * Math.cos(from + Math.PI),
    y: radius * Math.sin(from + Math.PI),
    bulge: 0,
  });
  const back = arcVertices(inner, from + Math.PI, -Math.PI);
  return {
    kind: 'path',
    vertices: [...outside, corner(outer), ...back, { ...polarOf(inner, from), bulge: 0 }],
  };
}

function polarOf(radius: number, angle: number) {
  return { x: radius * Math.cos(angle), y: radius * Math.sin(angle) };
}

const PLATES = 21;
const R1 = 25;
const R2 = 10;
const GAP = 0.5;

function meshedCapacitance(): number {
  // The rotor turns half a turn from open to meshed.
  const blade = { sector: Math.PI, radius: new Float64Array(2).fill(R1) };
  const rotor = { outside: halfRing(R1, 5, -Math.PI) };
  const stator = { outside: halfRing(30, R2, 0) };
  const [overlap] = overlapAt(rotor, stator, [Math.PI], { cutoutRadius: R2, blade });
  return (EPSILON_0 * (PLATES - 1) * overlap!.area) / GAP;
}

test('the area term of 21 plates, 25 and 10 mm, 0.5 mm apart is 292.070640 pF', () => {
  expect(meshedCapacitance() * 1e12).toBeCloseTo(292.07064, 3);
});

test('it agrees with the printed coefficient 0.1390 to its four figures', () => {
  const printed = (0.139 * (PLATES - 1) * ((R1 / 10) ** 2 - (R2 / 10) ** 2)) / (GAP / 10);
  expect(printed).toBeCloseTo(291.9, 6);
  expect(Math.abs(meshedCapacitance() * 1e12 - printed) / printed).toBeLessThan(6e-4);
});

test('the exact coefficient is 0.139081257', () => {
  // pF for lengths in cm: ε0·(π/2), F/mm to pF/cm.
  expect(EPSILON_0 * (Math.PI / 2) * 10 * 1e12).toBeCloseTo(0.139081257, 9);
});
