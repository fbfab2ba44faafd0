import { toDegrees } from '@/components/floor/degrees';
import { fixedUnit, type FixedUnit } from '@/components/floor/fixed-unit';
import { valueAt } from '@/components/floor/interpolate';
import type { SectionResult } from '@/geometry';

/** Totals of two sections over the shaft angle that both turn through. Arrays of one length. */
export interface LawDifference {
  /** Degrees. */
  readonly angle: readonly number[];
  /** Total of each, in the unit. */
  readonly first: readonly number[];
  readonly second: readonly number[];
  /** Second less first, pF. */
  readonly difference: readonly number[];
  /** The same, percent of the first's total at that angle. */
  readonly percent: readonly number[];
  readonly unit: FixedUnit;
}

const PICO = 1e12;

/** What another state of a section has more or less at the same shaft angle. */
export function lawDifference(a: SectionResult, b: SectionResult): LawDifference {
  const end = Math.min(a.law.angle.at(-1)!, b.law.angle.at(-1)!);
  const samples = [...new Set([...a.law.angle, ...b.law.angle])]
    .filter((angle) => angle < end)
    .sort((one, other) => one - other);
  const angles = [...samples, end];
  const first = angles.map((angle) => valueAt(a.law.angle, a.law.achieved, angle));
  const second = angles.map((angle) => valueAt(b.law.angle, b.law.achieved, angle));
  const unit = fixedUnit(Math.max(...first, ...second), 'capacitance');
  return {
    angle: angles.map(toDegrees),
    first: first.map(unit.scale),
    second: second.map(unit.scale),
    difference: first.map((total, i) => (second[i]! - total) * PICO),
    percent: first.map((total, i) => (100 * (second[i]! - total)) / total),
    unit,
  };
}
