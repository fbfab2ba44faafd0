import { expect, test } from 'vitest';
import { defaultDesign, derive } from '../../../geometry';
import { billTable, csvCell } from '../../../geometry/files/bill-table';
import { partsOf } from '../../../geometry/parts/assembly';
import { billOf } from '../../../geometry/parts/bill';

const derivation = derive(defaultDesign());
if (!derivation.ok) throw new Error('no plates');
const { derived } = derivation;
const parts = partsOf(derived);

test('every part has a line, and plates weigh what the stack says', () => {
  const bill = billOf(parts);
  expect(bill.map(({ item }) => item)).toEqual(parts.map((_, i) => i + 1));
  const plates = bill.filter(({ part }) => /^s\d+-(rotor|stator)$/.test(part.key));
  expect(plates.reduce((sum, line) => sum + line.mass!, 0)).toBeCloseTo(derived.stack.mass, 6);
});

test('a brass ring weighs its volume times 8.44 g/cm³ (handbook, from memory)', () => {
  const ring = billOf(parts).find(({ part }) => part.key === 's1-rotor-spacer')!;
  // Ø 12 outside, Ø 6 bore, 1.8 long, 13 off.
  const volume = (Math.PI / 4) * (12 ** 2 - 6 ** 2) * 1.8 * 13;
  expect(ring.mass).toBeCloseTo((volume / 1000) * 8.44, 6);
});

test.each([
  ['=1+1', "'=1+1"],
  ['+49', "'+49"],
  ['-5', "'-5"],
  ['@x', "'@x"],
  ['a,b', '"a,b"'],
  ['say "x"', '"say ""x"""'],
  ['plain', 'plain'],
])('a spreadsheet takes %s for text', (value, cell) => {
  expect(csvCell(value)).toBe(cell);
});

test('the table has a row for each part and the same columns in each', () => {
  const rows = billTable(parts).trimEnd().split('\r\n');
  expect(rows).toHaveLength(parts.length + 1);
  expect(rows[0]!.split(',')).toHaveLength(10);
});
