/**
 * Parallel curve of a closed contour, exact: lines stay lines, arcs stay arcs. All sides are
 * moved, corners that open are joined by an arc about the corner, everything is cut where it
 * crosses, and what comes nearer to the contour than the distance is thrown away.
 */

import { contourArea } from '../measure';
import type { Contour, Point } from '../outline';
import { meetings } from './meet';
import { narrowest, type Narrow } from './narrow';
import {
  distanceToSides,
  normalAt,
  pathOf,
  pointAt,
  SHORTEST,
  sideLength,
  sidesOf,
  stretch,
  type Side,
} from './side';

/** rad. Corners flatter than this are taken as smooth. */
const SMOOTH = 1e-4;

/** mm. Ends this near are one point: a corner just under SMOOTH leaves less at any usual kerf. */
const JOINED = 5e-5;

/** mm. How much nearer than the distance a point may lie by rounding. */
const ROUNDING = 1e-10;

/** In distances: contour further than this from its parallel curve has been closed up. */
const LEFT_BEHIND = 3;

export interface Offset {
  /** The parallel curve, one closed contour; null where nothing is left. */
  readonly contour: Contour | null;
  /** The narrowest place that closes up; null where none does. */
  readonly closing: Narrow | null;
}

interface Piece {
  readonly side: Side;
  readonly source: number;
}

function moved(side: Side, distance: number): Side | null {
  const shift = (fraction: 0 | 1): Point => {
    const at = pointAt(side, fraction);
    const normal = normalAt(side, fraction);
    return { x: at.x + normal.x * distance, y: at.y + normal.y * distance };
  };
  const ends = { from: shift(0), to: shift(1) };
  if (side.kind === 'line') return { ...side, ...ends };
  const radius = side.radius + Math.sign(side.sweep) * distance;
  return radius * Math.abs(side.sweep) > SHORTEST ? { ...side, ...ends, radius } : null;
}

function movedSides(sides: readonly Side[], distance: number): Side[] {
  return sides.flatMap((side, i) => {
    const next = sides[(i + 1) % sides.length]!;
    const out = normalAt(side, 1);
    const into = normalAt(next, 0);
    const turn = Math.atan2(out.x * into.y - out.y * into.x, out.x * into.x + out.y * into.y);
    const own = moved(side, distance);
    const result = own ? [own] : [];
    if (Math.abs(turn) < SMOOTH || turn * distance < 0) return result;
    const centre = side.to;
    const at = (normal: Point): Point => ({
      x: centre.x + normal.x * distance,
      y: centre.y + normal.y * distance,
    });
    const startAngle = Math.atan2(out.y * distance, out.x * distance);
    const radius = Math.abs(distance);
    const ends = { from: at(out), to: at(into) };
    result.push({ kind: 'arc', ...ends, centre, radius, startAngle, sweep: turn });
    return result;
  });
}

function boxesApart(a: Side, b: Side): boolean {
  const spread = (side: Side): [number, number, number] => {
    const middle = pointAt(side, 0.5);
    return [middle.x, middle.y, sideLength(side) / 2];
  };
  const [ax, ay, ar] = spread(a);
  const [bx, by, br] = spread(b);
  return Math.hypot(ax - bx, ay - by) > ar + br + JOINED;
}

/** Every side cut where it meets another. */
function cutUp(sides: readonly Side[]): Piece[] {
  const cuts: number[][] = sides.map(() => [0, 1]);
  for (let i = 0; i < sides.length; i++) {
    for (let j = i + 1; j < sides.length; j++) {
      if (boxesApart(sides[i]!, sides[j]!)) continue;
      for (const [onI, onJ] of meetings(sides[i]!, sides[j]!)) {
        cuts[i]!.push(onI);
        cuts[j]!.push(onJ);
      }
    }
  }
  return sides.flatMap((side, source) => {
    const length = sideLength(side);
    const inner = cuts[source]!.filter(
      (f) => f * length > SHORTEST && (1 - f) * length > SHORTEST,
    ).sort((a, b) => a - b);
    const at = [
      0,
      ...inner.filter((f, i) => i === 0 || (f - inner[i - 1]!) * length > SHORTEST),
      1,
    ];
    return at.slice(1).map((to, i) => ({ side: stretch(side, at[i]!, to), source }));
  });
}

const near = (a: Point, b: Point): boolean => Math.hypot(a.x - b.x, a.y - b.y) < JOINED;

/** Without pieces that run there and back: two walls one kerf apart. */
function withoutDoubles(pieces: readonly Piece[]): Piece[] {
  const back = ({ side: a }: Piece, { side: b }: Piece): boolean =>
    near(a.from, b.to) && near(a.to, b.from) && near(pointAt(a, 0.5), pointAt(b, 0.5));
  return pieces.filter((p) => !pieces.some((q) => q !== p && back(p, q)));
}

/** Without pieces that lead nowhere. */
function withoutSpurs(pieces: readonly Piece[]): Piece[] {
  let kept = [...pieces];
  for (;;) {
    const whole = kept.filter(
      ({ side }) =>
        kept.some((other) => near(other.side.from, side.to)) &&
        kept.some((other) => near(other.side.to, side.from)),
    );
    if (whole.length === kept.length) return whole;
    kept = whole;
  }
}

function loopsOf(pieces: readonly Piece[]): Piece[][] {
  const left = new Set(pieces);
  const loops: Piece[][] = [];
  for (const first of pieces) {
    if (!left.delete(first)) continue;
    const loop = [first];
    while (!near(loop.at(-1)!.side.to, first.side.from)) {
      const { to } = loop.at(-1)!.side;
      const next = [...left].find(({ side }) => near(side.from, to));
      if (!next) break;
      left.delete(next);
      loop.push(next);
    }
    if (near(loop.at(-1)!.side.to, first.side.from)) loops.push(loop);
  }
  return loops;
}

/** One side again out of what was cut and kept on both sides of the cut. */
function merged(loop: readonly Piece[]): Side[] {
  const result: Piece[] = [];
  const start = Math.max(
    0,
    loop.findIndex((piece, i) => piece.source !== loop.at(i - 1)!.source),
  );
  for (const piece of [...loop.slice(start), ...loop.slice(0, start)]) {
    const last = result.at(-1);
    if (last?.source !== piece.source) {
      result.push(piece);
      continue;
    }
    const a = last.side;
    const b = piece.side;
    const side: Side =
      a.kind === 'arc' && b.kind === 'arc'
        ? { ...a, to: b.to, sweep: a.sweep + b.sweep }
        : { kind: 'line', from: a.from, to: b.to };
    result[result.length - 1] = { ...last, side };
  }
  return result.map(({ side }) => side);
}

/** Is any of the contour further from its parallel curve than a corner would leave it? */
function leavesBehind(
  sides: readonly Side[],
  curve: readonly Side[],
  distance: number,
): Point | null {
  for (const side of sides) {
    for (const fraction of [0, 0.25, 0.5, 0.75]) {
      const at = pointAt(side, fraction);
      if (distanceToSides(curve, at) > LEFT_BEHIND * Math.abs(distance)) return at;
    }
  }
  return null;
}

/**
 * The contour grown or, with a negative distance, shrunk.
 * @param distance mm
 */
export function offsetContour(contour: Contour, distance: number): Offset {
  if (distance === 0) return { contour, closing: null };
  if (contour.kind === 'circle') {
    const radius = contour.radius + distance;
    if (radius > SHORTEST) return { contour: { ...contour, radius }, closing: null };
    const { x, y } = contour;
    return { contour: null, closing: { x, y, width: 2 * contour.radius } };
  }
  const sides = sidesOf(contour);
  const least = Math.abs(distance) - ROUNDING;
  const pieces = cutUp(movedSides(sides, distance)).filter(
    ({ side }) =>
      sideLength(side) > SHORTEST && distanceToSides(sides, pointAt(side, 0.5)) >= least,
  );
  const loops = loopsOf(withoutSpurs(withoutDoubles(pieces)))
    .map(merged)
    .map((loop) => ({ loop, area: Math.abs(contourArea(pathOf(loop))) }))
    .filter(({ area }) => area > distance ** 2 * 1e-6)
    .sort((a, b) => b.area - a.area);
  const largest = loops[0]?.loop ?? [];
  const left = leavesBehind(sides, largest, distance);
  return {
    contour: largest.length > 0 ? pathOf(largest) : null,
    closing: left && (narrowest(sides, distance > 0 ? 1 : -1) ?? { ...left, width: 0 }),
  };
}
