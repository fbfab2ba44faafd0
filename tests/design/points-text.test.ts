/** Tables of a law as people have them: typed, out of a spreadsheet, from a file. */
import { describe, expect, test } from 'vitest';
import { areOtherValue, asOtherValue } from '../../components/design/points-value';
import { readPoints, writePoints } from '../../components/design/points-text';

const DEGREE = Math.PI / 180;

function rowsOf(text: string, value: 'capacitance' | 'frequency') {
  const read = readPoints(text, value);
  if (!read.ok) throw new Error(read.message);
  const scale = value === 'frequency' ? 1e-3 : 1e12;
  return read.points.map(([angle, at]) => [
    Number((angle / DEGREE).toFixed(9)),
    Number((at * scale).toFixed(9)),
  ]);
}

describe.each([
  ['tabs', '0\t45.5\n90\t210\n'],
  ['tabs and decimal commas', '0\t45,5\n90\t210,0'],
  ['semicolons and decimal commas', '0;45,5\r\n90;210,0\r\n'],
  ['commas', '0,45.5\n90,210'],
  ['commas and blanks', '0, 45.5\n90, 210'],
  ['blanks', ' 0  45.5\n\n90  210 '],
  ['blanks and decimal commas', '0,0 45,5\n90,0 210,0'],
  ['quoted cells', '"0","45,5"\n"90","210"'],
  ['a heading', 'angle;capacitance\n0;45.5\n90;210'],
  ['units in the cells', '0° 45.5 pF\n90 deg 0.21 nF'],
  ['other units in the heading', 'Angle [rad];C [nF]\n0;0.0455\n1.5707963267949;0.21'],
  ['units behind a stroke', 'Angle/deg\tC/pF\n0\t45.5\n90\t210'],
  ['an empty last column', '0;45.5;\n90;210;'],
  ['line ends of old', '0;45.5\r90;210'],
])('%s', (_, text) => {
  test('are read', () => {
    expect(rowsOf(text, 'capacitance')).toEqual([
      [0, 45.5],
      [90, 210],
    ]);
  });
});

test('frequencies are kHz unless the table says otherwise', () => {
  expect(rowsOf('0 1600\n90 1.2 MHz', 'frequency')).toEqual([
    [0, 1600],
    [90, 1200],
  ]);
  expect(rowsOf('angle;f in MHz\n0;1.6\n90;1.2', 'frequency')).toEqual([
    [0, 1600],
    [90, 1200],
  ]);
});

test.each([
  ['0 1600\n60 many', 'Row 2, “60 many”'],
  ['0 1600\n60', 'Row 2, “60”'],
  ['0;1600;1500\n60;1200;1100', 'Row 1'],
  ['angle;C [pF]\n0;45', 'must be a frequency'],
  ['0\t1,600\n60\t1,200', '1,600 may be 1600 or 1.600'],
  ['0 45 pF', 'in kHz'],
])('%j is refused: %s', (text, words) => {
  const read = readPoints(text, 'frequency');
  expect(read.ok ? '' : read.message).toContain(words);
});

test('what is written is read back', () => {
  const text = 'angle;C\n0;45.25\n33.5;100.125\n180;390';
  const read = readPoints(text, 'capacitance');
  const written = read.ok ? writePoints(read.points, 'capacitance') : '';
  expect(written).toBe('0\t45.25\n33.5\t100.125\n180\t390');
  expect(rowsOf(written, 'capacitance')).toEqual(rowsOf(text, 'capacitance'));
});

test('rows of capacitances become those of the frequencies that they tune, and back', () => {
  // 200 µH with 100 pF and 400 pF: 1125.395 and 562.698 kHz; computed apart, 1/(2π√(LC)).
  const rows: [number, number][] = [
    [0, 100e-12],
    [1, 400e-12],
  ];
  expect(areOtherValue(rows, 'capacitance')).toBeNull();
  expect(areOtherValue([], 'frequency')).toBeNull();
  expect(areOtherValue('0 100', 'frequency')).toBeNull();
  expect(areOtherValue(rows, 'frequency')).toBe(rows);
  const tuned = asOtherValue(rows, 'frequency', 200e-6);
  expect(tuned[0]![1] / 1e3).toBeCloseTo(1125.395, 3);
  expect(tuned[1]![1] / 1e3).toBeCloseTo(562.698, 3);
  expect(areOtherValue(tuned, 'capacitance')).toBe(tuned);
  expect(asOtherValue(tuned, 'capacitance', 200e-6)[1]![1]).toBeCloseTo(400e-12, 20);
});
