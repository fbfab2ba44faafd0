import { toDegrees } from '@/components/floor/degrees';
import { fixedUnit, type FixedUnit } from '@/components/floor/fixed-unit';
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

/**
 * The value between samples on the cubic through them with the slopes of their neighbours. On
 * straight lines the difference of two laws whose samples lie elsewhere would show the samples.
 */
function smoothAt(angles: readonly number[], values: readonly number[], angle: number): number {
  const last = angles.length - 1;
  const after = angles.findIndex((sample) => sample >= angle);
  if (after <= 0) return after === 0 ? values[0]! : values[last]!;
  const slope = (i: number) => {
    const [from, to] = [Math.max(i - 1, 0), Math.min(i + 1, last)];
    return (values[to]! - values[from]!) / (angles[to]! - angles[from]!);
  };
  const before = after - 1;
  const width = angles[after]! - angles[before]!;
  const t = (angle - angles[before]!) / width;
  const [low, high] = [values[before]!, values[after]!];
  return (
    low * (1 + 2 * t) * (1 - t) ** 2 +
    high * t * t * (3 - 2 * t) +
    width * (slope(before) * t * (1 - t) ** 2 - slope(after) * t * t * (1 - t))
  );
}

/** What another state of a section has more or less at the same shaft angle. */
export function lawDifference(a: SectionResult, b: SectionResult): LawDifference {
  const end = Math.min(a.law.angle.at(-1)!, b.law.angle.at(-1)!);
  const samples = [...new Set([...a.law.angle, ...b.law.angle])]
    .filter((angle) => angle < end)
    .sort((one, other) => one - other);
  const angles = [...samples, end];
  const first = angles.map((angle) => smoothAt(a.law.angle, a.law.achieved, angle));
  const second = angles.map((angle) => smoothAt(b.law.angle, b.law.achieved, angle));
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
