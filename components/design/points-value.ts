import { resonantCapacitance, resonantFrequency } from '@/geometry/resonance';
import type { LawPoint } from '@/geometry';
import type { DraftValue } from './draft';
import type { PointValue } from './points-text';

/** Above it is a frequency in Hz, below it a capacitance in F: neither comes near. */
const BETWEEN = 1;

/** The rows, if they are of the other kind of value than the column shows. */
export function areOtherValue(
  value: DraftValue,
  column: PointValue,
): readonly LawPoint[] | null {
  if (!Array.isArray(value) || value.length === 0) return null;
  const rows = value as readonly LawPoint[];
  return rows.every(([, at]) => at < BETWEEN === (column === 'frequency')) ? rows : null;
}

/** The same law in the column's kind of value. @param inductance of the coil, H */
export function asOtherValue(
  rows: readonly LawPoint[],
  column: PointValue,
  inductance: number,
): LawPoint[] {
  const turn = column === 'frequency' ? resonantFrequency : resonantCapacitance;
  return rows.map(([angle, at]) => [angle, turn(at, inductance)]);
}
