/**
 * Total capacitance of a band: C = 1/((2πf)²L), so the ratio of the totals is the square of the
 * ratio of the frequencies. 530 to 1700 kHz: 10.2883588; 526.5 to 1606.5 kHz: 9.3103222
 * (computed from the equation).
 */
import { expect, test } from 'vitest';
import { defaultSection } from '../../geometry';
import { resonantCapacitance, resonantFrequency } from '../../geometry/resonance';
import { targetOf } from '../../geometry/target';

test.each([
  [530e3, 1700e3, 10.2883588],
  [526.5e3, 1606.5e3, 9.3103222],
])('from %f to %f Hz the total changes %f times', (bandLow, bandHigh, ratio) => {
  const target = targetOf(
    { ...defaultSection(), bandLow, bandHigh, inductance: 200e-6, stray: 0 },
    0,
    defaultSection(),
  );
  if ('code' in target) throw new Error(target.change);
  expect(target.totalMax / target.totalMin).toBeCloseTo(ratio, 7);
});

test('capacitance and frequency undo each other', () => {
  const capacitance = resonantCapacitance(1e6, 200e-6);
  expect(capacitance * 1e12).toBeCloseTo(126.651, 3);
  expect(resonantFrequency(capacitance, 200e-6)).toBeCloseTo(1e6, 3);
});
