/** All cuts of one sheet where they lie on it: what a file of the sheet holds. */

import { cutRuns, type CutRun, type KerfState } from '../cutting/cut-path';
import type { Machine } from '../cutting/machine';
import type { LaidGroup } from './lay-out';
import type { Placement } from './layout';
import { placedContour } from './placed';

export interface PlacedCuts {
  readonly placement: Placement;
  /** Inner cuts first. mm, from the sheet's lower left corner. */
  readonly runs: readonly CutRun[];
}

function placedRun(run: CutRun, placement: Placement): CutRun {
  const { contour, between, leadIn } = run;
  const chain = between && placedContour({ kind: 'path', vertices: between }, placement);
  const lead =
    leadIn &&
    placedContour(
      { kind: 'path', vertices: [leadIn.from, leadIn.to].map((p) => ({ ...p, bulge: 0 })) },
      placement,
    );
  const [from, to] = lead?.kind === 'path' ? lead.vertices : [];
  return {
    ...run,
    contour: contour && placedContour(contour, placement),
    between: chain?.kind === 'path' ? chain.vertices : null,
    leadIn: from && to ? { from: { x: from.x, y: from.y }, to: { x: to.x, y: to.y } } : null,
  };
}

/** Part by part from the left, so that what is cut stays clear of what is to come. */
export function sheetCuts(
  { parts, layout }: Pick<LaidGroup, 'parts' | 'layout'>,
  sheet: number,
  machine: Machine,
  state: KerfState,
): PlacedCuts[] {
  const runs = new Map(parts.map((part) => [part.key, cutRuns(part, machine, state)]));
  return layout.placements
    .filter((placement) => placement.sheet === sheet)
    .sort((a, b) => a.x - b.x || a.y - b.y)
    .map((placement) => ({
      placement,
      runs: runs.get(placement.key)!.map((run) => placedRun(run, placement)),
    }));
}
