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
