/** Bill of materials: what goes into one capacitor, a line each. */

import type { Part } from './part';

export interface BillLine {
  /** Place in the list of parts, from 1. */
  readonly item: number;
  readonly part: Part;
  /** Size as a shop writes it, mm. */
  readonly size: string;
  readonly material: string;
  /** All pieces together: g, and mm² of sheet; null where it doesn't apply. */
  readonly mass: number | null;
  readonly sheetArea: number | null;
}

const mm = (value: number): string => String(Number(value.toFixed(3)));

function sizeOf(part: Part): string {
  if (part.kind === 'bought') return part.size;
  if (part.kind === 'cut') return `${mm(part.thickness)} sheet`;
  return `Ø ${mm(part.outerDiameter)} / ${mm(part.boreDiameter)} × ${mm(part.length)}`;
}

/** Lines in the order of the parts. Sheet area is that of the faces, without what falls between. */
export function billOf(parts: readonly Part[]): BillLine[] {
  return parts.map((part, i) => ({
    item: i + 1,
    part,
    size: sizeOf(part),
    material: part.kind === 'bought' ? '' : part.material,
    mass: part.kind === 'bought' ? null : part.mass * part.quantity,
    sheetArea: part.kind === 'cut' ? part.area * part.quantity : null,
  }));
}
