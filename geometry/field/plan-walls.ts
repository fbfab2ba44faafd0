/** The walls that bound the open space in plan: what neither plate covers of the other's outline. */

import type { WallElement } from './plan-view';

/** A plate as a polygon, counter-clockwise: x, y, x, y, … mm. */
export type Polygon = readonly number[];

export interface Piece {
  readonly ax: number;
  readonly ay: number;
  readonly bx: number;
  readonly by: number;
}

function inside(polygon: Polygon, x: number, y: number): boolean {
  let odd = false;
  const n = polygon.length;
  for (let i = 0, j = n - 2; i < n; j = i, i += 2) {
    const yi = polygon[i + 1]!;
    const yj = polygon[j + 1]!;
    if (yi > y !== yj > y) {
      const xi = polygon[i]!;
      if (x < xi + ((polygon[j]! - xi) * (y - yi)) / (yj - yi)) odd = !odd;
    }
  }
  return odd;
}

export function sidesOf(polygon: Polygon): Piece[] {
  const n = polygon.length;
  return Array.from({ length: n / 2 }, (_, side) => ({
    ax: polygon[2 * side]!,
    ay: polygon[2 * side + 1]!,
    bx: polygon[(2 * side + 2) % n]!,
    by: polygon[(2 * side + 3) % n]!,
  }));
}

/** mm. Shorter pieces are left out. */
const SHORTEST_PIECE = 1e-9;

/** The parts of straight pieces that lie outside, or inside, a polygon. */
export function piecesBeside(
  pieces: readonly Piece[],
  polygon: Polygon,
  side: 'outside' | 'inside',
): Piece[] {
  const parts: Piece[] = [];
  const m = polygon.length;
  for (const { ax, ay, bx, by } of pieces) {
    const dx = bx - ax;
    const dy = by - ay;
    const cuts = [0, 1];
    for (let j = 0; j < m; j += 2) {
      const cx = polygon[j]!;
      const cy = polygon[j + 1]!;
      const ex = polygon[(j + 2) % m]! - cx;
      const ey = polygon[(j + 3) % m]! - cy;
      const cross = dx * ey - dy * ex;
      if (cross === 0) continue;
      const t = ((cx - ax) * ey - (cy - ay) * ex) / cross;
      const u = ((cx - ax) * dy - (cy - ay) * dx) / cross;
      if (t > 0 && t < 1 && u >= 0 && u <= 1) cuts.push(t);
    }
    cuts.sort((p, q) => p - q);
    for (let k = 1; k < cuts.length; k++) {
      const from = cuts[k - 1]!;
      const to = cuts[k]!;
      const middle = (from + to) / 2;
      if (to - from < SHORTEST_PIECE) continue;
      if (inside(polygon, ax + dx * middle, ay + dy * middle) !== (side === 'inside')) continue;
      parts.push({
        ax: ax + dx * from,
        ay: ay + dy * from,
        bx: ax + dx * to,
        by: ay + dy * to,
      });
    }
  }
  return parts;
}

function distanceTo(x: number, y: number, pieces: readonly Piece[]): number {
  let nearest = Infinity;
  for (const { ax, ay, bx, by } of pieces) {
    const dx = bx - ax;
    const dy = by - ay;
    const t = ((x - ax) * dx + (y - ay) * dy) / (dx * dx + dy * dy);
    const u = t < 0 ? 0 : t > 1 ? 1 : t;
    const px = x - ax - u * dx;
    const py = y - ay - u * dy;
    nearest = Math.min(nearest, px * px + py * py);
  }
  return Math.sqrt(nearest);
}

export interface WallOptions {
  /** Element lengths, mm: none is split below the first nor left above the second. */
  readonly shortest: number;
  readonly longest: number;
  /** An element is split while longer than this times its distance from the other kind. */
  readonly grading: number;
}

/** How a stack bounds the open space: its potential, and how far behind its edge it acts, mm. */
export type Wall = Pick<WallElement, 'potential' | 'setback'>;

/** A part of the plan that bounds the open space with one potential behind it. */
export interface Standing {
  readonly kind: 'rotor' | 'stator' | 'post';
  /** Which of the stators, or whose post; nothing for the rotor. */
  readonly stator: number;
  readonly pieces: readonly Piece[];
}

export interface PlanWall extends WallElement {
  readonly kind: Standing['kind'];
  readonly stator: number;
}

/**
 * @param rotor the rotor's part, turned to its mesh angle
 * @param others stators and posts
 * @param wallAt what a wall is whose middle is at a point
 */
export function planWalls(
  rotor: Standing,
  others: readonly Standing[],
  wallAt: (standing: Standing, x: number, y: number) => Wall,
  { shortest, longest, grading }: WallOptions,
): PlanWall[] {
  const elements: PlanWall[] = [];
  const add = (standing: Standing, facing: readonly Piece[]): void => {
    const { kind, stator } = standing;
    const split = ({ ax, ay, bx, by }: Piece): void => {
      const length = Math.hypot(bx - ax, by - ay);
      const mx = (ax + bx) / 2;
      const my = (ay + by) / 2;
      if (
        length > longest ||
        (length > 2 * shortest && length > grading * distanceTo(mx, my, facing))
      ) {
        split({ ax, ay, bx: mx, by: my });
        split({ ax: mx, ay: my, bx, by });
        return;
      }
      elements.push({ ax, ay, bx, by, kind, stator, ...wallAt(standing, mx, my) });
    };
    standing.pieces.forEach(split);
  };
  add(
    rotor,
    others.flatMap(({ pieces }) => pieces),
  );
  for (const standing of others) add(standing, rotor.pieces);
  return elements;
}
