import { describe, expect, test } from 'vitest';
import { readQuantity } from '@/components/units/quantity-reader';
import { sharedParameters, type Quantity } from '@/geometry';

const DEGREE = Math.PI / 180;

describe('quantities as people write them', () => {
  test.each<[string, Quantity, string, number]>([
    ['365 pF', 'capacitance', 'pF', 365e-12],
    ['365pF', 'capacitance', 'pF', 365e-12],
    ['365 pf', 'capacitance', 'nF', 365e-12],
    ['0.02 in', 'length', 'mm', 0.508],
    ['1/4 in', 'length', 'mm', 6.35],
    ['1 1/4"', 'length', 'mm', 31.75],
    ['20 thou', 'length', 'mm', 0.508],
    ['.5', 'length', 'mm', 0.5],
    ['530 kHz', 'frequency', 'MHz', 530e3],
    ['1.7MHz', 'frequency', 'kHz', 1.7e6],
    ['1e3', 'frequency', 'kHz', 1e6],
    ['240 µH', 'inductance', 'mH', 240e-6],
    ['1.2 kV', 'voltage', 'V', 1200],
    ['90', 'angle', '°', 90 * DEGREE],
    ['90 deg', 'angle', '°', 90 * DEGREE],
    ['1.5 rad', 'angle', '°', 1.5],
    ['-0.2', 'length', 'mm', -0.2],
    ['12', 'count', '', 12],
    ['1.000537', 'ratio', '', 1.000537],
  ])('%s is a %s', (text, quantity, shown, value) => {
    const read = readQuantity(text, quantity, shown);
    expect(read).not.toBeNull();
    expect(Math.abs(read! - value)).toBeLessThanOrEqual(1e-14 * Math.abs(value));
  });

  test.each<[string, Quantity, string]>([
    ['', 'length', 'mm'],
    ['thick', 'length', 'mm'],
    ['5 kHz', 'length', 'mm'],
    ['5 mm2', 'length', 'mm'],
    ['1,600', 'frequency', 'kHz'],
    ['0.5.2', 'length', 'mm'],
    ['1/0 in', 'length', 'mm'],
    ['12 mm', 'count', ''],
    ['1e999', 'length', 'mm'],
  ])('%s is no %s', (text, quantity, shown) => {
    expect(readQuantity(text, quantity, shown)).toBeNull();
  });

  test('the bounds of the travel can be written in degrees', () => {
    const { min, max } = sharedParameters.travel;
    expect(readQuantity('60', 'angle', '°')).toBeGreaterThanOrEqual(min);
    expect(readQuantity('180 deg', 'angle', '°')).toBeLessThanOrEqual(max);
  });
});
