import { describe, expect, it } from 'vitest';
import { fixedUnit } from '@/components/floor/fixed-unit';
import { valueAt } from '@/components/floor/interpolate';
import { lawReader, lawSeries } from '@/components/floor/law-series';
import { resonantFrequency, type SectionResult } from '@/geometry';

describe('value between samples', () => {
  const angles = [0, 1, 3, 4];
  const values = [10, 20, 0, 8];
  it('lies on the line between neighbours', () => {
    expect(valueAt(angles, values, 0.25)).toBe(12.5);
    expect(valueAt(angles, values, 2)).toBe(10);
    expect(valueAt(angles, values, 3.75)).toBe(6);
    expect(valueAt(angles, values, 3)).toBe(0);
  });
  it('is the nearest sample outside them', () => {
    expect(valueAt(angles, values, -1)).toBe(10);
    expect(valueAt(angles, values, 9)).toBe(8);
  });
  it('is nothing beside a sample without a value', () => {
    expect(valueAt([0, 1, 2], [5, 7, null], 1.5)).toBeNull();
    expect(valueAt([0, 1, 2], [5, 7, null], 0.5)).toBe(6);
    expect(valueAt([0, 1, 2], [5, 7, null], 2)).toBeNull();
  });
  it('refuses samples that do not pair', () => {
    expect(() => valueAt([0, 1], [1], 0.5)).toThrow('2 angles and 1 values');
    expect(() => valueAt([], [], 0.5)).toThrow('0 angles');
  });
});

describe('fixed unit', () => {
  it('keeps unit and decimals of the largest value', () => {
    const unit = fixedUnit(375.71e-12, 'capacitance');
    expect(unit.unit).toBe('pF');
    expect(unit.write(375.71e-12)).toBe('375.7');
    expect(unit.write(40e-12)).toBe('40.0');
    expect(fixedUnit(14e-12, 'capacitance').write(2.1e-12)).toBe('2.10');
    expect(fixedUnit(1.7e6, 'frequency').write(950.4e3)).toBe('950');
    expect(fixedUnit(30e6, 'frequency')).toMatchObject({ unit: 'MHz' });
  });
});

describe('law series', () => {
  const section = {
    totalMin: 40e-12,
    totalMax: 400e-12,
    inductance: 240e-6,
    law: {
      angle: [0, Math.PI / 2, Math.PI],
      target: [40e-12, 220e-12, null],
      achieved: [40e-12, 220.9e-12, 399.64e-12],
      areaOnly: [40e-12, 210e-12, 390e-12],
      error: [0, 0.9e-12, null],
      largestError: { fraction: 0.0025, capacitance: 0.9e-12, angle: Math.PI / 2 },
    },
  } as unknown as SectionResult;

  it('gives degrees, pF, percent of the range and kHz', () => {
    const series = lawSeries(section);
    expect(series.angle).toEqual([0, 90, 180]);
    expect(series.achieved[1]).toBeCloseTo(220.9, 9);
    expect(series.error[1]).toBeCloseTo(0.25, 9);
    expect(series.areaOnly[1]).toBeCloseTo(210, 9);
    expect(series.largest.error).toBeCloseTo(0.25, 9);
    expect(series.tuned![0]).toBeCloseTo(resonantFrequency(40e-12, 240e-6) / 1e3, 9);
    expect(series.tuned![0]).toBeGreaterThan(series.tuned![2]!);
  });

  it('has neither target nor error in a rest', () => {
    const series = lawSeries(section);
    expect(series.target[2]).toBeNull();
    expect(series.error[2]).toBeNull();
  });

  it('has no frequency without a coil', () => {
    const series = lawSeries({ ...section, inductance: null });
    expect(series.tuned).toBeNull();
    expect(series.frequency).toBeNull();
    expect(lawReader({ ...section, inductance: null })(1).frequency).toBeNull();
  });

  it('reads the achieved total between samples, not the target', () => {
    const read = lawReader(section);
    expect(read(Math.PI / 2).capacitance).toBe('220.9 pF');
    expect(read((3 * Math.PI) / 4).capacitance).toBe('310.3 pF');
    expect(read(0).frequency).toBe('1624 kHz');
  });
});
