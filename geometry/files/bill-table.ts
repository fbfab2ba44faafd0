/** The bill of materials as a CSV table. */

import { billOf } from '../parts/bill';
import type { Part } from '../parts/part';

/**
 * One cell. Text that a spreadsheet would take for a formula gets an apostrophe before it (OWASP,
 * "CSV Injection": cells that begin with = + - @, tab or carriage return), and quotes where needed.
 */
export function csvCell(value: string | number): string {
  if (typeof value === 'number') return String(value);
  const safe = /^[=+\-@\t\r]/.test(value) ? `'${value}` : value;
  return /[",\r\n]/.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe;
}

export function billTable(parts: readonly Part[]): string {
  const head = [
    'item',
    'part',
    'key',
    'kind',
    'quantity',
    'size_mm',
    'material',
    'mass_all_g',
    'sheet_area_all_cm2',
    'note',
  ];
  const rows = billOf(parts).map(({ item, part, size, material, mass, sheetArea }) => [
    item,
    part.label,
    part.key,
    part.kind,
    part.quantity,
    size,
    material,
    mass === null ? '' : Number(mass.toFixed(2)),
    sheetArea === null ? '' : Number((sheetArea / 100).toFixed(2)),
    part.note,
  ]);
  return [head, ...rows].map((row) => row.map(csvCell).join(',')).join('\r\n') + '\r\n';
}
