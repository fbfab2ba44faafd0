/** What the machine's tool follows: contours moved by half the kerf, with lead-ins and bridges. */

import { contourLength } from '../measure';
import type { Contour, Path, Point, Vertex } from '../outline';
import type { CutPart } from '../parts/part';
import type { Machine } from './machine';
import { offsetContour } from './offset';
import {
  bulgeOf,
  distanceToSides,
  normalAt,
  pathOf,
  pointAt,
  sideLength,
  sidesOf,
  stretch,
  type Side,
} from './side';

/** Whether files hold the part's own size or the middle of the cut. */
export type KerfState = 'nominal' | 'compensated';

/** One cut from piercing to end. mm */
export interface CutRun {
  /** Inner cuts come before outer ones: the part must not move first. */
  readonly edge: 'inner' | 'outer';
  /** The whole contour; null where bridges divide it. */
  readonly contour: Contour | null;
  /** The cut between two bridges, the last vertex being its end; null for a whole contour. */
  readonly between: readonly Vertex[] | null;
  /** Where the sheet is pierced, in the waste, and where the contour is reached; null for on it. */
  readonly leadIn: { readonly from: Point; readonly to: Point } | null;
  /** Lead-in and cut. */
  readonly length: number;
}

/** The contours a tool follows: outside and holes. null where the kerf leaves nothing of one. */
export interface CutContours {
  readonly outside: Contour | null;
  readonly holes: readonly (Contour | null)[];
}

/** Outer contours move out and inner ones in, by half the kerf. */
export function compensated(
  part: Pick<CutPart, 'outside' | 'holes'>,
  kerf: number,
): CutContours {
  return {
    outside: offsetContour(part.outside, kerf / 2).contour,
    holes: part.holes.map((hole) => offsetContour(hole, -kerf / 2).contour),
  };
}

/** In a lead-in: how much nearer than its own length its start may come to the contour. */
const CLEAR = 0.999;

/** A contour that begins at a fraction of one of its sides. */
function startingAt(sides: readonly Side[], index: number, fraction: number): Side[] {
  const side = sides[index]!;
  const rest = [...sides.slice(index + 1), ...sides.slice(0, index)];
  if (fraction <= 0) return [side, ...rest];
  return [stretch(side, fraction, 1), ...rest, stretch(side, 0, fraction)];
}

interface Start {
  readonly index: number;
  readonly from: Point;
  readonly to: Point;
  readonly length: number;
}

/** The start in the middle of a side whose piercing lies clearest in the waste, longest side first. */
function startOf(sides: readonly Side[], edge: CutRun['edge'], leadIn: number): Start {
  const away = edge === 'outer' ? 1 : -1;
  const order = sides
    .map((side, index) => ({ side, index, length: sideLength(side) }))
    .sort((a, b) => b.length - a.length || a.index - b.index);
  // In a hole smaller than the lead-in, as far in as there is room.
  for (const length of [leadIn, leadIn / 2, leadIn / 4]) {
    for (const { side, index } of order) {
      const to = pointAt(side, 0.5);
      const normal = normalAt(side, 0.5);
      const from = { x: to.x + away * normal.x * length, y: to.y + away * normal.y * length };
      if (distanceToSides(sides, from) >= length * CLEAR) return { index, from, to, length };
    }
  }
  const { side, index } = order[0]!;
  const to = pointAt(side, 0.5);
  return { index, from: to, to, length: 0 };
}

/** A closed chain cut into equal stretches with gaps between them, the first begun after `shift`. */
function dividedBy(
  sides: readonly Side[],
  bridges: number,
  gap: number,
  shift: number,
): Side[][] {
  const total = sides.reduce((sum, side) => sum + sideLength(side), 0);
  const pitch = total / bridges;
  return Array.from({ length: bridges }, (_, k) => {
    const from = k * pitch + shift;
    const to = (k + 1) * pitch + shift - gap;
    let at = 0;
    // Twice round, for the stretch that passes the chain's own beginning.
    return [...sides, ...sides].flatMap((side) => {
      const length = sideLength(side);
      const a = Math.max(0, (from - at) / length);
      const b = Math.min(1, (to - at) / length);
      at += length;
      return b - a > 1e-9 ? [stretch(side, a, b)] : [];
    });
  });
}

/** Places along a pitch at which bridges are tried until every lead-in is clear. */
const SHIFTS = 12;

/** The stretches between bridges: moved along until each can be reached through the waste. */
function stretchesOf(
  sides: readonly Side[],
  bridges: number,
  gap: number,
  leadIn: number,
): Side[][] {
  const pitch = sides.reduce((sum, side) => sum + sideLength(side), 0) / bridges;
  const tried = Array.from({ length: SHIFTS }, (_, k) =>
    dividedBy(sides, bridges, gap, (k * pitch) / SHIFTS),
  );
  const clear = (runs: Side[][]): boolean => runs.every((run) => leadTo(sides, run, leadIn));
  return (leadIn > 0 && tried.find(clear)) || tried[0]!;
}

function leadTo(sides: readonly Side[], run: readonly Side[], length: number): Start | null {
  const first = run[0]!;
  const normal = normalAt(first, 0);
  const from = {
    x: first.from.x + normal.x * length,
    y: first.from.y + normal.y * length,
  };
  if (length === 0 || distanceToSides(sides, from) < length * CLEAR) return null;
  return { index: 0, from, to: first.from, length };
}

function runsOf(contour: Contour, edge: CutRun['edge'], machine: Machine): CutRun[] {
  const sides = sidesOf(contour);
  const start = startOf(sides, edge, machine.leadIn);
  const leadIn = start.length > 0 ? { from: start.from, to: start.to } : null;
  const length = contourLength(contour);
  // Each cut takes half a kerf off either end of a bridge.
  const gap = machine.bridgeWidth + machine.kerf;
  const bridges = edge === 'outer' ? machine.bridges : 0;
  if (bridges === 0 || gap * bridges * 2 > length) {
    // A circle stays a circle; a path begins where the lead-in comes to it.
    const begun: Path | null =
      contour.kind === 'path' && leadIn ? pathOf(startingAt(sides, start.index, 0.5)) : null;
    return [
      {
        edge,
        contour: begun ?? contour,
        between: null,
        leadIn,
        length: length + start.length,
      },
    ];
  }
  const chain = startingAt(sides, start.index, 0.5);
  return stretchesOf(chain, bridges, gap, machine.leadIn).map((run): CutRun => {
    const lead = leadTo(sides, run, machine.leadIn);
    const last = run.at(-1)!;
    return {
      edge,
      contour: null,
      between: [
        ...run.map((side) => ({ ...side.from, bulge: bulgeOf(side) })),
        { ...last.to, bulge: 0 },
      ],
      leadIn: lead && { from: lead.from, to: lead.to },
      length: run.reduce((sum, side) => sum + sideLength(side), 0) + (lead?.length ?? 0),
    };
  });
}

/**
 * All cuts of one part, inner ones first.
 * @param state nominal leaves the contours where they are drawn
 */
export function cutRuns(
  part: Pick<CutPart, 'outside' | 'holes'>,
  machine: Machine,
  state: KerfState,
): CutRun[] {
  const { outside, holes } = state === 'compensated' ? compensated(part, machine.kerf) : part;
  return [
    ...holes.flatMap((hole) => (hole ? runsOf(hole, 'inner', machine) : [])),
    ...(outside ? runsOf(outside, 'outer', machine) : []),
  ];
}
