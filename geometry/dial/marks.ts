/** What a dial has to mark: values of the finished law, at the angles where they stand. */

import type { SectionResult } from '../derived';
import { lawInverse } from './law-inverse';
import { overlaps, type Box } from './box';
import type { DialQuantity } from './quantity';
import { roundness, steps } from './steps';

export interface DialMark {
  /** Hz, m or F. */
  readonly value: number;
  /** Shaft angle from the open stop, rad. */
  readonly angle: number;
  readonly rank: 'long' | 'middle' | 'short';
  /** Written beside a long mark that has room for it. */
  readonly label: string | null;
}

export interface Spacing {
  /** Length along the scale for a shaft angle of 1 rad, mm. */
  readonly perRadian: number;
  /** Nearest that two marks may stand, mm. */
  readonly apart: number;
  /** Paper that a number takes at a shaft angle, with the room about it. */
  readonly boxOf: (label: string, angle: number) => Box;
}

const written = (value: number): string => String(Number(value.toPrecision(6)));

/**
 * Marks over the law of a finished section, in rising order of their values: as many as stand far
 * enough apart, so that a crowded end has fewer; numbers in steps of their own, none over another.
 * @throws DialError
 */
export function dialMarks(
  section: Pick<SectionResult, 'law' | 'inductance'>,
  quantity: DialQuantity,
  { perRadian, apart, boxOf }: Spacing,
): DialMark[] {
  const { low, high, scale, angleAt } = lawInverse(section, quantity);
  const along = (value: number): number => angleAt(value) * perRadian;
  const values = steps(low, high, (some) =>
    some.every((value, i) => i === 0 || Math.abs(along(value) - along(some[i - 1]!)) >= apart),
  );
  const marked = new Set(values);
  const box = (value: number): Box => boxOf(written(value), angleAt(value));
  const numbered = new Set(
    steps(low, high, (some) => {
      if (!some.every((value) => marked.has(value))) return false;
      const boxes = some.map(box);
      // On a dial of nearly a full turn the first may meet the last.
      return boxes.every((one, i) =>
        boxes.slice(i + 1).every((other) => !overlaps(one, other)),
      );
    }),
  );
  const free = unhindered([...numbered], box);
  return values.map((value, i): DialMark => {
    const label = free.has(value);
    const neighbours = [values[i - 1], values[i + 1]].filter((other) => other !== undefined);
    const finest = Math.min(...neighbours.map((other) => Math.abs(other - value)));
    const times = roundness(value) / finest;
    return {
      value: value / scale,
      angle: angleAt(value),
      rank: label || times > 9.9 ? 'long' : times > 4.9 ? 'middle' : 'short',
      label: label ? written(value) : null,
    };
  });
}

/** Steps are looked at one by one; where two of them meet over a gap, the rounder number stays. */
function unhindered(values: readonly number[], box: (value: number) => Box): Set<number> {
  const kept = new Map<number, Box>();
  const byRoundness = [...values].sort((a, b) => roundness(b) - roundness(a) || a - b);
  for (const value of byRoundness) {
    const own = box(value);
    if (![...kept.values()].some((other) => overlaps(own, other))) kept.set(value, own);
  }
  return new Set(kept.keys());
}
