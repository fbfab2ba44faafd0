/** What a trimmer has to reach so that stacks built within their tolerances can be aligned. */

import type { Derived } from '../derived';
import type { Outcome } from '../tolerance/stacks';

export interface TrimmerRange {
  readonly section: number;
  /** With the plates as drawn, F. */
  readonly nominal: number;
  /** From the stack with most capacitance where the law begins to the one with least, F. */
  readonly least: number;
  readonly most: number;
  /**
   * By how much the stacks with most are beyond what a trimmer can take away, F: the circuit's
   * stray has to be that much less, or the trimmer counted on from the start. 0 where all can be
   * aligned.
   */
  readonly missing: number;
}

/**
 * From the middle 90 of 100 stacks of the Monte Carlo, where the law begins.
 * @param outcome of the same section, from `stacksByChance`
 * @param reserve of the spread, added at either side for the circuit's own stray
 */
export function trimmerRange(
  { sections }: Derived,
  section: number,
  { asBuilt }: Pick<Outcome, 'asBuilt'>,
  reserve = 0.2,
): TrimmerRange {
  const { trimmer } = sections[section]!;
  // The error counts the nominal trimmer in: a stack with too much needs that much less.
  const [low, high] = [trimmer - asBuilt.high[0]!, trimmer - asBuilt.low[0]!];
  const room = reserve * (high - low);
  return {
    section,
    nominal: trimmer,
    least: Math.max(0, low - room),
    most: Math.max(0, high + room),
    missing: Math.max(0, -low),
  };
}
