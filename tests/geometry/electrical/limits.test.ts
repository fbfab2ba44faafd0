import { describe, expect, test } from 'vitest';
import { defaultDesign } from '../../../geometry';
import { gapLimits, gapThatHolds, worksAtRadio } from '../../../geometry/electrical/limits';

describe('the least limit', () => {
  test('small gaps by common practice, wide ones by the table for square edges', () => {
    const small = gapLimits(0.5, 0, true);
    expect(small.least).toBe(small.practice);
    const wide = gapLimits(10, 0, true);
    expect(wide.least).toBe(wide.squared);
    expect(wide.squared).toBeLessThan(wide.practice);
  });

  test('radio frequency takes a fifth off breakdown alone', () => {
    const [direct, radio] = [gapLimits(1, 0, false), gapLimits(1, 0, true)];
    expect(radio.breakdown / direct.breakdown).toBeCloseTo(0.8, 12);
    expect(radio.squared).toBe(direct.squared);
  });
});

test('radio frequency by the working frequency, or else by the band', () => {
  const section = defaultDesign().sections[0]!;
  expect(worksAtRadio({ ...section, workingFrequency: 50 })).toBe(false);
  expect(worksAtRadio({ ...section, workingFrequency: 1e6 })).toBe(true);
  expect(worksAtRadio({ ...section, workingFrequency: null, targetKind: 'band' })).toBe(true);
});

test('the gap that is named holds the voltage, and a slightly smaller one does not', () => {
  for (const altitude of [0, 3e6]) {
    for (const workingVoltage of [900, 3000, 6000]) {
      const design = { ...defaultDesign(), altitude };
      const section = { ...design.sections[0]!, workingVoltage };
      const gap = gapThatHolds(design, section)!;
      expect(gapLimits(gap, altitude, true).least).toBeGreaterThanOrEqual(workingVoltage);
      expect(gapLimits(gap / 1.03, altitude, true).least).toBeLessThan(workingVoltage);
    }
  }
});

test('more than the clearance table knows is never held', () => {
  const design = defaultDesign();
  const section = { ...design.sections[0]!, workingVoltage: 30e3 };
  expect(gapThatHolds(design, section)).toBeNull();
});
