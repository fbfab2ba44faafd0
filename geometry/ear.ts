/** Ears: the metal that carries a stator plate on its posts, let into the outer edge. */

import { TWO_PI } from './constants';
import { arcOf, type Arc, type Point, type Vertex } from './outline';

/** An open chain of lines and arcs: the last vertex is its end and its bulge counts for nothing. */
export type Chain = readonly Vertex[];

interface Cut {
  /** Side of the chain, and how far along it, 0 to 1. */
  readonly side: number;
  readonly along: number;
  readonly point: Point;
}

/** The ear's own frame: along the radial line through the post, and across it. */
interface Frame {
  readonly cos: number;
  readonly sin: number;
}

function toFrame({ cos, sin }: Frame, { x, y }: Point): Point {
  return { x: x * cos + y * sin, y: y * cos - x * sin };
}

function fromFrame({ cos, sin }: Frame, { x, y }: Point): Point {
  return { x: x * cos - y * sin, y: x * sin + y * cos };
}

/** Fraction of an arc at which it passes a point on its circle; outside 0 to 1 if it does not. */
function fractionAt(arc: Arc, point: Point): number {
  const angle = Math.atan2(point.y - arc.centre.y, point.x - arc.centre.x) - arc.startAngle;
  const turned = (((Math.sign(arc.sweep) * angle) % TWO_PI) + TWO_PI) % TWO_PI;
  // Just before the start counts as the start.
  return turned > TWO_PI - 1e-9 ? 0 : turned / Math.abs(arc.sweep);
}

/** Points of a circle with a given distance across the frame, on its outer side first. */
function acrossAt(frame: Frame, arc: Arc, across: number): Point[] {
  const centre = toFrame(frame, arc.centre);
  const rise = arc.radius ** 2 - (across - centre.y) ** 2;
  if (rise < 0) return [];
  const half = Math.sqrt(rise);
  return [centre.x + half, centre.x - half].map((x) => fromFrame(frame, { x, y: across }));
}

/** Points at which two circles meet. */
function meeting(arc: Arc, centre: Point, radius: number): Point[] {
  const dx = centre.x - arc.centre.x;
  const dy = centre.y - arc.centre.y;
  const apart = Math.hypot(dx, dy);
  if (apart === 0) return [];
  const along = (apart ** 2 + arc.radius ** 2 - radius ** 2) / (2 * apart);
  const rise = arc.radius ** 2 - along ** 2;
  if (rise < 0) return [];
  const half = Math.sqrt(rise);
  const foot = {
    x: arc.centre.x + (dx / apart) * along,
    y: arc.centre.y + (dy / apart) * along,
  };
  return [1, -1].map((sign) => ({
    x: foot.x - (sign * half * dy) / apart,
    y: foot.y + (sign * half * dx) / apart,
  }));
}

export interface EarShape {
  /** Angle of the post, rad; distance from the shaft and radius of the boss, mm. */
  readonly angle: number;
  readonly circleRadius: number;
  readonly earRadius: number;
}

/** Where the chain meets one flank of the ear: its straight side or its round boss. */
function flankCut(chain: Chain, frame: Frame, ear: EarShape, sign: 1 | -1): Cut | null {
  const { circleRadius: rp, earRadius: re } = ear;
  const boss = fromFrame(frame, { x: rp, y: 0 });
  for (let side = 0; side < chain.length - 1; side++) {
    const from = chain[side]!;
    if (from.bulge === 0) continue;
    const arc = arcOf(from, chain[side + 1]!, from.bulge);
    const onFlank = [
      ...acrossAt(frame, arc, sign * re).filter((p) => {
        const { x } = toFrame(frame, p);
        return x > 0 && x <= rp;
      }),
      ...meeting(arc, boss, re).filter((p) => {
        const { x, y } = toFrame(frame, p);
        return x > rp && y * sign > 0;
      }),
    ];
    for (const point of onFlank) {
      const along = fractionAt(arc, point);
      if (along >= 0 && along <= 1) return { side, along, point };
    }
  }
  return null;
}

/** The ear's outline from one cut to the other. */
function outlineOf(frame: Frame, ear: EarShape, from: Point, to: Point): Vertex[] {
  const { circleRadius: rp, earRadius: re } = ear;
  const corner = (point: Point, bulge: number): Vertex => ({ ...point, bulge });
  const start = toFrame(frame, from);
  if (start.x <= rp) {
    return [
      corner(from, 0),
      corner(fromFrame(frame, { x: rp, y: -re }), 1),
      corner(fromFrame(frame, { x: rp, y: re }), 0),
    ];
  }
  const end = toFrame(frame, to);
  const half = (Math.atan2(end.y, end.x - rp) - Math.atan2(start.y, start.x - rp)) / 2;
  return [corner(from, Math.tan(half / 2))];
}

/**
 * Lets an ear into the outer edge of a stator, counter-clockwise.
 * @returns the chain with the ear; the chain as it was when the ear lies wholly inside it; null
 *   when the ear reaches over an end of the chain
 */
export function withEar(chain: Chain, ear: EarShape): Chain | null {
  const frame: Frame = { cos: Math.cos(ear.angle), sin: Math.sin(ear.angle) };
  const first = flankCut(chain, frame, ear, -1);
  const last = flankCut(chain, frame, ear, 1);
  if (!first && !last) return chain;
  if (!first || !last) return null;
  const part = (bulge: number, share: number): number => Math.tan(Math.atan(bulge) * share);
  const before = chain.slice(0, first.side + 1);
  const entered = before[first.side]!;
  before[first.side] = { ...entered, bulge: part(entered.bulge, first.along) };
  const left = chain[last.side]!;
  return [
    ...before,
    ...outlineOf(frame, ear, first.point, last.point),
    { ...last.point, bulge: part(left.bulge, 1 - last.along) },
    ...chain.slice(last.side + 1),
  ];
}
