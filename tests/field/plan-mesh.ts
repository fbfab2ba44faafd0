/**
 * The plan view of a stack as triangles, and its Laplacian.
 *
 * Linear triangles with masses lumped to the corners: on a grid of rectangles this is the usual
 * five-point difference formula; on skewed cells it keeps the energy an upper bound.
 */

import { turn } from './angle';

/** What a point of the plan, and a level of the stack, may be part of. */
export const part = { rotor: 1, stator: 2, shaft: 4, post: 8 } as const;
export type Metric = 'cartesian' | 'polar';

export interface Triangulation {
  metric: Metric;
  /** Radius (mm) or x (mm) of each point. */
  first: Float64Array;
  /** Angle (rad, one turn is periodic) or y (mm) of each point. */
  second: Float64Array;
  /** Which parts' plan each point lies in: bits of `part`. */
  mask: Uint8Array;
  /** Three points each. */
  corners: Int32Array;
}

export interface PlanMesh {
  count: number;
  mask: Uint8Array;
  /** Area round each point, mm². */
  area: Float64Array;
  /** Neighbours of point p: neighbour[start[p] … start[p + 1]) and the conductance to each. */
  start: Int32Array;
  neighbour: Int32Array;
  conductance: Float64Array;
}

/** Cotangents of a triangle's angles and its area, in a metric taken at its centroid. */
function triangleShape(t: Triangulation, at: number, out: Float64Array): void {
  const a = t.corners[at]!;
  const b = t.corners[at + 1]!;
  const c = t.corners[at + 2]!;
  const r = t.metric === 'polar' ? (t.first[a]! + t.first[b]! + t.first[c]!) / 3 : 1;
  let yb = t.second[b]! - t.second[a]!;
  let yc = t.second[c]! - t.second[a]!;
  if (t.metric === 'polar') {
    yb -= turn * Math.round(yb / turn);
    yc -= turn * Math.round(yc / turn);
  }
  yb *= r;
  yc *= r;
  const xb = t.first[b]! - t.first[a]!;
  const xc = t.first[c]! - t.first[a]!;
  const twice = Math.abs(xb * yc - xc * yb);
  out[0] = (xb * xc + yb * yc) / twice;
  out[1] = (xb * (xb - xc) + yb * (yb - yc)) / twice;
  out[2] = (xc * (xc - xb) + yc * (yc - yb)) / twice;
  out[3] = twice / 2;
}

/** Assembles the Laplacian of a triangulation. */
export function planMesh(t: Triangulation): PlanMesh {
  const count = t.first.length;
  const area = new Float64Array(count);
  // Each side of each triangle twice, then sorted by point and merged.
  const degree = new Int32Array(count + 1);
  for (const p of t.corners) degree[p + 1] = degree[p + 1]! + 4;
  for (let p = 0; p < count; p += 1) degree[p + 1] = degree[p + 1]! + degree[p]!;
  const looseStart = degree;
  const filled = looseStart.slice(0, count);
  const looseTo = new Int32Array(looseStart[count]!);
  const looseValue = new Float64Array(looseStart[count]!);
  const add = (p: number, q: number, value: number) => {
    const at = filled[p]!;
    let s = looseStart[p]!;
    while (s < at && looseTo[s] !== q) s += 1;
    looseTo[s] = q;
    looseValue[s] = looseValue[s]! + value;
    if (s === at) filled[p] = at + 1;
  };
  const shape = new Float64Array(4);
  for (let at = 0; at < t.corners.length; at += 3) {
    triangleShape(t, at, shape);
    for (let k = 0; k < 3; k += 1) {
      const p = t.corners[at + ((k + 1) % 3)]!;
      const q = t.corners[at + ((k + 2) % 3)]!;
      add(p, q, shape[k]! / 2);
      add(q, p, shape[k]! / 2);
      const corner = t.corners[at + k]!;
      area[corner] = area[corner]! + shape[3]! / 3;
    }
  }
  const start = new Int32Array(count + 1);
  const neighbour: number[] = [];
  const conductance: number[] = [];
  for (let p = 0; p < count; p += 1) {
    for (let s = looseStart[p]!; s < filled[p]!; s += 1) {
      // The diagonal of a rectangle conducts nothing.
      if (Math.abs(looseValue[s]!) < 1e-12) continue;
      neighbour.push(looseTo[s]!);
      conductance.push(looseValue[s]!);
    }
    start[p + 1] = neighbour.length;
  }
  return {
    count,
    mask: t.mask,
    area,
    start,
    neighbour: Int32Array.from(neighbour),
    conductance: Float64Array.from(conductance),
  };
}
