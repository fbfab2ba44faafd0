/** One side of a contour by itself: a straight line or a circular arc, with a direction. mm, rad. */

import { TWO_PI } from '../constants';
import { contourArea } from '../measure';
import { arcOf, type Arc, type Contour, type Path, type Point, type Vertex } from '../outline';
import { polar } from '../polar';
import { STRAIGHT } from '../tolerances';

export interface LineSide {
  readonly kind: 'line';
  readonly from: Point;
  readonly to: Point;
}

export interface ArcSide extends Arc {
  readonly kind: 'arc';
  readonly from: Point;
  readonly to: Point;
}

export type Side = LineSide | ArcSide;

/** Sides shorter than this are left out. mm; a thousandth of what a machine can place. */
export const SHORTEST = 1e-6;

function sideOf(a: Vertex, b: Point): Side {
  const from = { x: a.x, y: a.y };
  const to = { x: b.x, y: b.y };
  if (Math.abs(a.bulge) < STRAIGHT) return { kind: 'line', from, to };
  return { kind: 'arc', from, to, ...arcOf(a, b, a.bulge) };
}

/** The sides of a contour in order, counter-clockwise whichever way it was drawn. */
export function sidesOf(contour: Contour): Side[] {
  if (contour.kind === 'circle') {
    const { x, y, radius } = contour;
    const half: Vertex[] = [
      { x: x + radius, y, bulge: 1 },
      { x: x - radius, y, bulge: 1 },
    ];
    return chainSides(half, true);
  }
  const sides = chainSides(contour.vertices, true);
  return contourArea(contour) < 0 ? sides.map(reversed).reverse() : sides;
}

/** Sides along vertices; a closed chain also goes back from the last to the first. */
export function chainSides(vertices: readonly Vertex[], closed: boolean): Side[] {
  const last = closed ? vertices.length : vertices.length - 1;
  const sides: Side[] = [];
  for (let i = 0; i < last; i++) {
    const a = vertices[i]!;
    const b = vertices[(i + 1) % vertices.length]!;
    if (Math.hypot(b.x - a.x, b.y - a.y) > SHORTEST) sides.push(sideOf(a, b));
  }
  return sides;
}

function reversed(side: Side): Side {
  const turned = { ...side, from: side.to, to: side.from };
  return turned.kind === 'line'
    ? turned
    : { ...turned, startAngle: turned.startAngle + turned.sweep, sweep: -turned.sweep };
}

export const bulgeOf = (side: Side): number =>
  side.kind === 'line' ? 0 : Math.tan(side.sweep / 4);

/** A closed path of sides that follow one another. */
export function pathOf(sides: readonly Side[]): Path {
  return {
    kind: 'path',
    vertices: sides.map((side) => ({ ...side.from, bulge: bulgeOf(side) })),
  };
}

export function sideLength(side: Side): number {
  if (side.kind === 'arc') return side.radius * Math.abs(side.sweep);
  return Math.hypot(side.to.x - side.from.x, side.to.y - side.from.y);
}

/** Point at a fraction of the side. */
export function pointAt(side: Side, fraction: number): Point {
  if (fraction === 0) return side.from;
  if (fraction === 1) return side.to;
  if (side.kind === 'line') {
    const { from, to } = side;
    return { x: from.x + (to.x - from.x) * fraction, y: from.y + (to.y - from.y) * fraction };
  }
  const { x, y } = polar(side.radius, side.startAngle + side.sweep * fraction);
  return { x: side.centre.x + x, y: side.centre.y + y };
}

/** Unit normal on the right hand: out of a contour that runs counter-clockwise. */
export function normalAt(side: Side, fraction: number): Point {
  if (side.kind === 'line') {
    const length = sideLength(side);
    return { x: (side.to.y - side.from.y) / length, y: (side.from.x - side.to.x) / length };
  }
  return polar(Math.sign(side.sweep), side.startAngle + side.sweep * fraction);
}

/** The stretch between two fractions. */
export function stretch(side: Side, from: number, to: number): Side {
  const ends = { from: pointAt(side, from), to: pointAt(side, to) };
  if (side.kind === 'line') return { kind: 'line', ...ends };
  return {
    ...side,
    ...ends,
    startAngle: side.startAngle + side.sweep * from,
    sweep: side.sweep * (to - from),
  };
}

/** Fraction at which an arc passes the bearing of a point from its centre; over 1 if it doesn't. */
export function fractionTowards(arc: ArcSide, point: Point): number {
  const bearing = Math.atan2(point.y - arc.centre.y, point.x - arc.centre.x);
  const turned = Math.sign(arc.sweep) * (bearing - arc.startAngle);
  const ahead = ((turned % TWO_PI) + TWO_PI) % TWO_PI;
  const span = Math.abs(arc.sweep);
  // Just before the start counts as the start.
  return ahead > span && TWO_PI - ahead < 1e-10 ? 0 : ahead / span;
}

export interface Nearest {
  readonly distance: number;
  readonly fraction: number;
}

/** The point of a side nearest to a point. */
export function nearestOn(side: Side, point: Point): Nearest {
  const end = (fraction: 0 | 1): Nearest => {
    const at = pointAt(side, fraction);
    return { distance: Math.hypot(point.x - at.x, point.y - at.y), fraction };
  };
  if (side.kind === 'line') {
    const dx = side.to.x - side.from.x;
    const dy = side.to.y - side.from.y;
    const square = dx * dx + dy * dy;
    const along = ((point.x - side.from.x) * dx + (point.y - side.from.y) * dy) / square;
    if (along <= 0) return end(0);
    if (along >= 1) return end(1);
    const across = (point.x - side.from.x) * dy - (point.y - side.from.y) * dx;
    return { distance: Math.abs(across) / Math.sqrt(square), fraction: along };
  }
  const fraction = fractionTowards(side, point);
  if (fraction <= 1) {
    const { centre, radius } = side;
    const away = Math.hypot(point.x - centre.x, point.y - centre.y);
    return { distance: Math.abs(away - radius), fraction };
  }
  const first = end(0);
  const last = end(1);
  return first.distance <= last.distance ? first : last;
}

/** Distance from a point to the nearest of some sides, mm. */
export function distanceToSides(sides: readonly Side[], point: Point): number {
  let nearest = Infinity;
  for (const side of sides) nearest = Math.min(nearest, nearestOn(side, point).distance);
  return nearest;
}
