/**
 * Paschen's law for air, A = 112.50 /(kPa·cm), B = 2737.50 V/(kPa·cm), γ = 0.01, 101.325 kPa:
 * constants published; values computed from the equation.
 * 1 kV peak per millimetre with rounded edges: common practice, no source.
 */
import { expect, test } from 'vitest';
import { paschenVoltage, practiceVoltage } from '../../geometry/electrical/breakdown';

test.each([
  [0.5, 2879.6],
  [1, 5034.7],
  [2, 8944.0],
  [5, 19482],
])('%f mm of air breaks down at %f V peak', (gap, voltage) => {
  expect(Math.abs(paschenVoltage(gap) / voltage - 1)).toBeLessThan(3e-5);
});

test('the working figure keeps well below breakdown', () => {
  for (const gap of [0.1, 0.5, 1, 5, 15]) {
    expect(practiceVoltage(gap)).toBeLessThan(paschenVoltage(gap) / 1.7);
  }
});

// Minimum at p·d = e·ln(1 + 1/γ)/A, V = B·e·ln(1 + 1/γ)/A: computed from the equation.
test('no gap is so small that air breaks down below the minimum of the curve', () => {
  const least = (2737.5 * Math.E * Math.log(101)) / 112.5;
  for (const gap of [1e-4, 1e-3, 0.005, 0.02]) {
    expect(paschenVoltage(gap)).toBeGreaterThan(least - 1e-6);
  }
  expect(paschenVoltage(1e-3)).toBeCloseTo(least, 6);
});

test('all figures fall with altitude and rise with the gap', () => {
  for (let altitude = 0; altitude < 10e6; altitude += 5e5) {
    let [air, practice] = [0, 0];
    for (const gap of [0.1, 0.2, 0.5, 1, 3, 10]) {
      expect(paschenVoltage(gap, altitude + 5e5)).toBeLessThan(paschenVoltage(gap, altitude));
      expect(practiceVoltage(gap, altitude + 5e5)).toBeLessThan(practiceVoltage(gap, altitude));
      expect(paschenVoltage(gap, altitude)).toBeGreaterThan(air);
      expect(practiceVoltage(gap, altitude)).toBeGreaterThan(practice);
      [air, practice] = [paschenVoltage(gap, altitude), practiceVoltage(gap, altitude)];
    }
  }
});
