/** How near two sides, or two contours, come to each other: exact for lines and arcs. */

import type { Point } from '../outline';
import { meetings } from './meet';
import {
  fractionTowards,
  nearestOn,
  pointAt,
  sideLength,
  type ArcSide,
  type LineSide,
  type Side,
} from './side';

export interface Apart {
  /** mm */
  readonly distance: number;
  /** Fractions along the first and the second side. */
  readonly onFirst: number;
  readonly onSecond: number;
}

/** Fractions at which an arc has its centre, or the far side of it, in line with a point. */
function inLine(arc: ArcSide, point: Point): number[] {
  const { centre } = arc;
  const opposite = { x: 2 * centre.x - point.x, y: 2 * centre.y - point.y };
  return [point, opposite].map((p) => fractionTowards(arc, p)).filter((f) => f <= 1);
}

function lineFoot(line: LineSide, point: Point): number {
  const dx = line.to.x - line.from.x;
  const dy = line.to.y - line.from.y;
  const along = (point.x - line.from.x) * dx + (point.y - line.from.y) * dy;
  return along / (dx * dx + dy * dy);
}

/** Pairs within both sides where the distance may be least. */
function innerPairs(a: Side, b: Side): (readonly [number, number])[] {
  if (a.kind === 'arc' && b.kind === 'arc') {
    return inLine(a, b.centre).flatMap((f) => inLine(b, a.centre).map((g) => [f, g] as const));
  }
  if (a.kind === 'line' && b.kind === 'arc') {
    const foot = lineFoot(a, b.centre);
    if (foot < 0 || foot > 1) return [];
    return inLine(b, pointAt(a, foot)).map((g) => [foot, g] as const);
  }
  if (a.kind === 'arc' && b.kind === 'line') {
    return innerPairs(b, a).map(([g, f]) => [f, g] as const);
  }
  return [];
}

/** The nearest points of two sides. */
export function sidesApart(a: Side, b: Side): Apart {
  const meeting = meetings(a, b)[0];
  if (meeting) return { distance: 0, onFirst: meeting[0], onSecond: meeting[1] };
  let best: Apart = { distance: Infinity, onFirst: 0, onSecond: 0 };
  const keep = (onFirst: number, onSecond: number, distance: number): void => {
    if (distance < best.distance) best = { distance, onFirst, onSecond };
  };
  for (const end of [0, 1] as const) {
    const fromA = nearestOn(b, pointAt(a, end));
    keep(end, fromA.fraction, fromA.distance);
    const fromB = nearestOn(a, pointAt(b, end));
    keep(fromB.fraction, end, fromB.distance);
  }
  for (const [f, g] of innerPairs(a, b)) {
    const p = pointAt(a, f);
    const q = pointAt(b, g);
    keep(f, g, Math.hypot(p.x - q.x, p.y - q.y));
  }
  return best;
}

/** A side with a disc that holds it: most pairs are told apart by their discs. */
export interface Held {
  readonly side: Side;
  readonly middle: Point;
  readonly reach: number;
}

export function held(side: Side): Held {
  return { side, middle: pointAt(side, 0.5), reach: sideLength(side) / 2 };
}

/** Distance below which two sides can't come, mm. */
export function atLeastApart(a: Held, b: Held): number {
  const between = Math.hypot(a.middle.x - b.middle.x, a.middle.y - b.middle.y);
  return between - a.reach - b.reach;
}

/** Smallest distance between the sides of two contours, mm; 0 where they cross. */
export function contoursApart(a: readonly Held[], b: readonly Held[]): number {
  let least = Infinity;
  for (const p of a) {
    for (const q of b) {
      if (atLeastApart(p, q) < least)
        least = Math.min(least, sidesApart(p.side, q.side).distance);
    }
  }
  return least;
}
