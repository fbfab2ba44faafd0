import { expect, test } from 'vitest';
import { formatQuantity, type Quantity } from '../../geometry';

test.each<[number, Quantity, string]>([
  [365e-12, 'capacitance', '365 pF'],
  [0.5e-12, 'capacitance', '0.5 pF'],
  [2.2e-9, 'capacitance', '2200 pF'],
  [22e-9, 'capacitance', '22 nF'],
  [0, 'capacitance', '0 pF'],
  [1600e3, 'frequency', '1600 kHz'],
  [28.5e6, 'frequency', '28.5 MHz'],
  [237e-6, 'inductance', '237 µH'],
  [0.5, 'length', '0.5 mm'],
  [Math.PI, 'angle', '180°'],
  [300, 'voltage', '300 V'],
  [2500, 'voltage', '2.5 kV'],
  [14, 'count', '14'],
])('%f as %s reads %s', (value, quantity, text) => {
  expect(formatQuantity(value, quantity)).toBe(text);
});
