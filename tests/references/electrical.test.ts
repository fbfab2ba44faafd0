/**
 * Voltage, loss and drift against the outside. IEC 60664-1:2020 clearances and altitude factors:
 * published, read second-hand. Skin depth δ = √(ρ/(π·f·µ0)): values computed from the equation
 * with published resistivities of silver and copper. Expansion figures: handbook, from memory.
 */
import { describe, expect, test } from 'vitest';
import { defaultDesign } from '../../geometry';
import { pressureAt } from '../../geometry/electrical/atmosphere';
import { paschenVoltage } from '../../geometry/electrical/breakdown';
import { altitudeFactor, clearanceVoltage } from '../../geometry/electrical/clearance';
import { sectionDrift } from '../../geometry/electrical/drift';
import { skinDepth } from '../../geometry/electrical/loss';

describe('clearance table', () => {
  test.each([
    [0.04, 'inhomogeneous', 500],
    [0.26, 'inhomogeneous', 1000],
    [1.27, 'inhomogeneous', 2000],
    [3.8, 'inhomogeneous', 4000],
    [15.2, 'inhomogeneous', 10000],
    [0.15, 'homogeneous', 1000],
    [1.2, 'homogeneous', 4000],
  ] as const)('%f mm, %s field: %f V', (gap, field, voltage) => {
    expect(clearanceVoltage(gap, field)).toBeCloseTo(voltage, 6);
  });

  test.each([
    [0, 1],
    [2000, 1],
    [3000, 1.14],
    [5000, 1.48],
    [10000, 3.02],
  ])('at %f m the clearance grows %f times', (metres, factor) => {
    expect(altitudeFactor(metres * 1000)).toBeCloseTo(factor, 9);
  });

  test('outside the table nothing is said', () => {
    expect(clearanceVoltage(0.03, 'inhomogeneous')).toBeNull();
    expect(clearanceVoltage(1, 'inhomogeneous', 11e6)).toBeNull();
  });

  test('more gap never holds less, more altitude never more', () => {
    let before = 0;
    for (let gap = 0.05; gap < 16; gap += 0.05) {
      const voltage = clearanceVoltage(gap, 'inhomogeneous')!;
      expect(voltage).toBeGreaterThanOrEqual(before);
      before = voltage;
      const high = clearanceVoltage(gap, 'inhomogeneous', 4e6);
      if (high !== null) expect(high).toBeLessThanOrEqual(voltage);
    }
  });
});

// ISO 2533 standard atmosphere, kPa, from memory.
test.each([
  [0, 101.325],
  [1000, 89.874],
  [2000, 79.495],
  [5000, 54.02],
])('at %f m the air has %f kPa', (metres, pressure) => {
  expect(Math.abs(pressureAt(metres * 1000) / pressure - 1)).toBeLessThan(5e-4);
});

test('thinner air breaks down sooner', () => {
  for (const gap of [0.2, 1, 5]) {
    expect(paschenVoltage(gap, 3e6)).toBeLessThan(paschenVoltage(gap));
  }
});

describe('skin depth in µm at 1, 7 and 30 MHz', () => {
  test.each([
    ['silver', [63.46, 23.99, 11.59]],
    ['copper', [65.23, 24.66, 11.91]],
    ['brass', [129.3, 48.87, 23.61]],
  ] as const)('%s', (metal, depths) => {
    [1e6, 7e6, 30e6].forEach((frequency, i) => {
      const depth = skinDepth(metal, frequency) * 1e3;
      expect(Math.abs(depth / depths[i]! - 1)).toBeLessThan(5e-4);
    });
  });
});

describe('drift with temperature', () => {
  test('plates and spacers of one metal: area twice, gap once the other way', () => {
    const design = defaultDesign();
    const { area, gap } = sectionDrift(design, design.sections[0]!);
    expect(area).toBeCloseTo(2 * 19.8e-6, 12);
    expect(gap).toBeCloseTo(-19.8e-6, 12);
  });

  test('2αp − (S·αs − t·αp)/(2g): brass plates on steel spacers, S 1.8, t 0.8, g 0.5', () => {
    const design = defaultDesign();
    design.spacerMaterial = 'steel';
    const { area, gap } = sectionDrift(design, design.sections[0]!);
    expect(area + gap).toBeCloseTo(2 * 19.8e-6 - (1.8 * 11.5e-6 - 0.8 * 19.8e-6) / 1, 12);
  });
});
