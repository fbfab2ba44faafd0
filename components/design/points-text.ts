import { readQuantity } from '@/components/units/quantity-reader';
import { writeQuantity, type LawPoint, type Quantity } from '@/geometry';

/** What the second column of a law's table holds. */
export type PointValue = Extract<Quantity, 'capacitance' | 'frequency'>;

export const pointUnits: Record<PointValue, string> = { capacitance: 'pF', frequency: 'kHz' };

const scales: Record<PointValue, number> = { capacitance: 1e12, frequency: 1e-3 };

/** The cells of a line: split at a tab, a semicolon, a comma that is no decimal one, or blanks. */
function cellsOf(line: string): string[] {
  if (line.includes('"')) {
    return [...line.matchAll(/"([^"]*)"|[^",;\t]+/g)].map(([all, quoted]) =>
      (quoted ?? all).trim(),
    );
  }
  for (const separator of [/\t/, /;/, /,\s+/]) {
    if (separator.test(line)) return line.split(separator).map((cell) => cell.trim());
  }
  const commas = line.split(',').length - 1;
  if (commas === 1 && !/\d\s+[\d.]/.test(line)) {
    return line.split(',').map((cell) => cell.trim());
  }
  return line.trim().split(/\s+(?=[-+.\d])/);
}

/** `1,600`: a decimal comma, or thousands. */
const AMBIGUOUS = /^[-+]?[1-9]\d{0,2},\d{3}(?!\d)/;
const COMMA = /^([-+]?\d*),(\d)/;

/** The unit that a heading's cell names in brackets, behind a stroke or after `in`. */
function unitOf(heading: string, quantity: Quantity): string | null | undefined {
  const named = /[([]\s*([^)\]]+?)\s*[)\]]|(?:\/|\bin\b)\s*(\S+)\s*$/.exec(heading);
  const unit = named?.[1] ?? named?.[2];
  if (unit === undefined) return undefined;
  return readQuantity('1', quantity, unit) === null ? null : unit;
}

export type ReadPoints =
  | { readonly ok: true; readonly points: LawPoint[] }
  | { readonly ok: false; readonly message: string };

const refused = (row: number, line: string, words: string): ReadPoints => ({
  ok: false,
  message: `Row ${row}, “${line.trim().slice(0, 40)}”: ${words}`,
});

/**
 * Reads a table as typed, pasted from a spreadsheet, or from a CSV file. A heading is passed over
 * but for the units that it names.
 */
export function readPoints(text: string, value: PointValue): ReadPoints {
  const points: LawPoint[] = [];
  const rows = text
    .split(/\r?\n|\r/)
    .filter((line) => line.trim() !== '')
    .map((line) => ({ line, cells: cellsOf(line) }));
  const commas = rows.flatMap(({ cells }) => cells).filter((cell) => COMMA.test(cell));
  const unclear = commas.length > 0 && commas.every((cell) => AMBIGUOUS.test(cell));
  let angleUnit = '°';
  let valueUnit = pointUnits[value];
  for (const [i, { line, cells }] of rows.entries()) {
    if (unclear && cells.includes(commas[0]!)) {
      const number = AMBIGUOUS.exec(commas[0]!)![0];
      const words = `${number} may be ${number.replace(',', '')} or ${number.replace(',', '.')}; write which`;
      return refused(i + 1, line, words);
    }
    const [first = '', second = '', ...rest] = cells.map((cell) =>
      cell.replace(COMMA, '$1.$2'),
    );
    const angle = readQuantity(first, 'angle', angleUnit);
    const at = readQuantity(second, value, valueUnit);
    if (angle !== null && at !== null && rest.every((cell) => cell === '')) {
      points.push([angle, at]);
    } else if (i === 0 && !/^[-+.\d]/.test(first)) {
      angleUnit = unitOf(first, 'angle') ?? angleUnit;
      const unit = unitOf(second, value);
      if (unit === null) return refused(1, line, `the second column must be a ${value}`);
      valueUnit = unit ?? valueUnit;
    } else {
      const like = value === 'frequency' ? '980' : '212.5';
      const words = `give an angle in degrees and a ${value} in ${pointUnits[value]}, like 90 ${like}`;
      return refused(i + 1, line, words);
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
