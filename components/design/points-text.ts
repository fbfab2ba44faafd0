import { readQuantity } from '@/components/units/quantity-reader';
import { writeQuantity, type LawPoint, type Quantity } from '@/geometry';

/** What the second column of a law's table holds. */
export type PointValue = Extract<Quantity, 'capacitance' | 'frequency'>;

export const pointUnits: Record<PointValue, string> = { capacitance: 'pF', frequency: 'kHz' };

const scales: Record<PointValue, number> = { capacitance: 1e12, frequency: 1e-3 };

/** The two cells of a line: split at a tab, a semicolon, a comma that is no decimal one, or blanks. */
function cellsOf(line: string): string[] {
  for (const separator of [/\t/, /;/, /,\s+/]) {
    if (separator.test(line)) return line.split(separator).map((cell) => cell.trim());
  }
  const commas = line.split(',').length - 1;
  if (commas === 1 && !/\d\s+[\d.]/.test(line)) {
    return line.split(',').map((cell) => cell.trim());
  }
  return line.trim().split(/\s+(?=[-+.\d])/);
}

const decimalPoint = (cell: string): string => cell.replace(/^([-+]?\d*),(\d)/, '$1.$2');

export type ReadPoints =
  | { readonly ok: true; readonly points: LawPoint[] }
  | { readonly ok: false; readonly message: string };

/** Reads a table as typed, pasted from a spreadsheet, or from a CSV file; a heading is passed over. */
export function readPoints(text: string, value: PointValue): ReadPoints {
  const points: LawPoint[] = [];
  const lines = text.split(/\r?\n/).filter((line) => line.trim() !== '');
  for (const [i, line] of lines.entries()) {
    const [first = '', second = '', ...rest] = cellsOf(line).map(decimalPoint);
    const angle = readQuantity(first, 'angle', '°');
    const at = readQuantity(second, value, pointUnits[value]);
    if (angle !== null && at !== null && rest.every((cell) => cell === '')) {
      points.push([angle, at]);
    } else if (i > 0 || /^[-+.\d]/.test(first)) {
      return {
        ok: false,
        message: `Row ${i + 1}, “${line.trim().slice(0, 40)}”: give an angle in degrees and a ${value} in ${pointUnits[value]}, like 90 ${value === 'frequency' ? '980' : '212.5'}`,
      };
    }
  }
  return { ok: true, points };
}

const plain = (number: number, digits: number): string =>
  String(Number(number.toPrecision(digits)));

/** The table as text, a row a line. */
export function writePoints(points: readonly LawPoint[], value: PointValue): string {
  return points
    .map(([angle, at]) => {
      const { number } = writeQuantity(angle, 'angle', 6);
      return `${number}\t${plain(at * scales[value], 7)}`;
    })
    .join('\n');
}
