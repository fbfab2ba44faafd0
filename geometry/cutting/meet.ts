/** Where two sides meet, in closed form. */

import type { Point } from '../outline';
import { fractionTowards, nearestOn, type ArcSide, type LineSide, type Side } from './side';

/** How far beyond an end a meeting still counts, as a fraction of the side. */
const PAST = 1e-9;

/** mm. Ends nearer than this to another side lie on it. */
const ON = 1e-7;

/** Fractions along the first and the second side. */
export type Meeting = readonly [number, number];

const within = (fraction: number): boolean => fraction >= -PAST && fraction <= 1 + PAST;

function lineWithLine(a: LineSide, b: LineSide): Meeting[] {
  const ax = a.to.x - a.from.x;
  const ay = a.to.y - a.from.y;
  const bx = b.to.x - b.from.x;
  const by = b.to.y - b.from.y;
  const cross = ax * by - ay * bx;
  if (Math.abs(cross) < 1e-14 * Math.hypot(ax, ay) * Math.hypot(bx, by)) return [];
  const dx = b.from.x - a.from.x;
  const dy = b.from.y - a.from.y;
  return [[(dx * by - dy * bx) / cross, (dx * ay - dy * ax) / cross]];
}

function lineWithArc(line: LineSide, arc: ArcSide): Meeting[] {
  const dx = line.to.x - line.from.x;
  const dy = line.to.y - line.from.y;
  const length = Math.hypot(dx, dy);
  const fx = line.from.x - arc.centre.x;
  const fy = line.from.y - arc.centre.y;
  const along = -(fx * dx + fy * dy) / length;
  const across = (fx * dy - fy * dx) / length;
  const rise = arc.radius ** 2 - across ** 2;
  if (rise < 0) return [];
  return [-1, 1].map((sign) => {
    const fraction = (along + sign * Math.sqrt(rise)) / length;
    const point = { x: line.from.x + dx * fraction, y: line.from.y + dy * fraction };
    return [fraction, fractionTowards(arc, point)];
  });
}

function arcWithArc(a: ArcSide, b: ArcSide): Meeting[] {
  const dx = b.centre.x - a.centre.x;
  const dy = b.centre.y - a.centre.y;
  const apart = Math.hypot(dx, dy);
  if (apart < 1e-12 || apart > a.radius + b.radius) return [];
  const along = (apart ** 2 + a.radius ** 2 - b.radius ** 2) / (2 * apart);
  const rise = a.radius ** 2 - along ** 2;
  if (rise < 0) return [];
  return [-1, 1].map((sign) => {
    const across = sign * Math.sqrt(rise);
    const point = {
      x: a.centre.x + (dx * along - dy * across) / apart,
      y: a.centre.y + (dy * along + dx * across) / apart,
    };
    return [fractionTowards(a, point), fractionTowards(b, point)];
  });
}

function crossings(a: Side, b: Side): Meeting[] {
  if (a.kind === 'line') return b.kind === 'line' ? lineWithLine(a, b) : lineWithArc(a, b);
  if (b.kind === 'arc') return arcWithArc(a, b);
  return lineWithArc(b, a).map(([onB, onA]) => [onA, onB]);
}

/** All points at which two sides cross or touch, and the ends of either that lie on the other. */
export function meetings(a: Side, b: Side): Meeting[] {
  const touches = (side: Side, end: Point, at: number, flip: boolean): Meeting[] => {
    const { distance, fraction } = nearestOn(side, end);
    if (distance > ON) return [];
    return [flip ? [fraction, at] : [at, fraction]];
  };
  return [
    ...crossings(a, b).filter(([onA, onB]) => within(onA) && within(onB)),
    ...touches(b, a.from, 0, false),
    ...touches(b, a.to, 1, false),
    ...touches(a, b.from, 0, true),
    ...touches(a, b.to, 1, true),
  ];
}

/**
 * Where a ray from a point first meets some sides.
 * @param reach mm
 * @returns the distance, the side and the fraction along it; null where it meets none
 */
export function firstHit(
  sides: readonly Side[],
  from: Point,
  direction: Point,
  reach: number,
): { distance: number; side: Side; fraction: number } | null {
  const to = { x: from.x + direction.x * reach, y: from.y + direction.y * reach };
  const ray: LineSide = { kind: 'line', from, to };
  let best: { distance: number; side: Side; fraction: number } | null = null;
  for (const side of sides) {
    for (const [along, fraction] of crossings(ray, side)) {
      const distance = along * reach;
      if (distance < ON || along > 1 || !within(fraction)) continue;
      if (!best || distance < best.distance) best = { distance, side, fraction };
    }
  }
  return best;
}
