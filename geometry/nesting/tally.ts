/** What a layout takes: metal, cuts, piercings and time. */

import { cutRuns, type KerfState } from '../cutting/cut-path';
import type { Machine } from '../cutting/machine';
import type { CutPart } from '../parts/part';
import type { Layout } from './layout';

export interface Tally {
  /** Area of the parts over the area of the sheets, whole; 0 to 1. */
  readonly yieldOfSheets: number;
  /** The same over what is used: the last sheet counts as far as its last part and the margin. */
  readonly yieldOfUsed: number;
  readonly sheets: number;
  /** mm, lead-ins included. */
  readonly cutLength: number;
  readonly pierces: number;
  /**
   * s; cutting and piercing alone, without moves from cut to cut, loading and speeding up. null
   * for etching, which takes the whole sheet at once.
   */
  readonly time: number | null;
}

export function tallyOf(
  layout: Layout,
  parts: readonly CutPart[],
  machine: Machine,
  state: KerfState,
): Tally {
  const each = new Map(
    parts.map((part) => {
      const runs = cutRuns(part, machine, state);
      const length = runs.reduce((sum, run) => sum + run.length, 0);
      return [part.key, { area: part.area, length, pierces: runs.length }];
    }),
  );
  let area = 0;
  let cutLength = 0;
  let pierces = 0;
  for (const { key } of layout.placements) {
    const part = each.get(key)!;
    area += part.area;
    cutLength += part.length;
    pierces += part.pierces;
  }
  const { sheets } = layout;
  const whole = sheets.reduce((sum, { width, height }) => sum + width * height, 0);
  const used = sheets.reduce(
    (sum, { width, height, used: taken }, i) =>
      sum + (i === sheets.length - 1 ? taken : width) * height,
    0,
  );
  return {
    yieldOfSheets: whole > 0 ? area / whole : 0,
    yieldOfUsed: used > 0 ? area / used : 0,
    sheets: sheets.length,
    cutLength,
    pierces,
    time:
      machine.process === 'etching'
        ? null
        : cutLength / machine.feed + pierces * machine.pierceTime,
  };
}
