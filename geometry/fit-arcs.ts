/**
 * Fits a smooth curve with tangent circular arcs, as few as the tolerance allows. Each step
 * takes the longest stretch that one pair of tangent arcs (a biarc with equal tangent lengths)
 * follows.
 * K. M. Bolton, "Biarc curves", Computer-Aided Design 7(2), 1975 (from memory).
 */

import { arcOf, type Vertex } from './outline';
import { SAME_ARC, STRAIGHT } from './tolerances';

/** Samples of the curve in order, with unit tangents. mm. */
export interface CurveSamples {
  readonly x: Float64Array;
  readonly y: Float64Array;
  readonly tx: Float64Array;
  readonly ty: Float64Array;
}

export interface FittedArcs {
  /** Where the arcs start, each with its bulge; the curve's last point is not among them. */
  readonly vertices: Vertex[];
  /** Largest distance of a sample from the arcs, mm. */
  readonly deviation: number;
}

interface Biarc {
  readonly joint: { x: number; y: number };
  readonly bulges: readonly [number, number];
}

/** tan of half the angle that turns direction a into direction b. */
function halfTurn(ax: number, ay: number, bx: number, by: number): number {
  const bulge = Math.tan(Math.atan2(ax * by - ay * bx, ax * bx + ay * by) / 2);
  return Math.abs(bulge) < STRAIGHT ? 0 : bulge;
}

function biarcBetween(s: CurveSamples, i: number, j: number): Biarc {
  const vx = s.x[j]! - s.x[i]!;
  const vy = s.y[j]! - s.y[i]!;
  const t0x = s.tx[i]!;
  const t0y = s.ty[i]!;
  const t1x = s.tx[j]!;
  const t1y = s.ty[j]!;
  const vt = vx * (t0x + t1x) + vy * (t0y + t1y);
  const vv = vx * vx + vy * vy;
  const turn = 2 * (1 - (t0x * t1x + t0y * t1y));
  // Rationalised root of turn·d² + 2·vt·d − vv = 0: also right for parallel tangents (turn = 0).
  const d = vv / (vt + Math.sqrt(vt * vt + turn * vv));
  const joint = {
    x: (s.x[i]! + s.x[j]! + d * (t0x - t1x)) / 2,
    y: (s.y[i]! + s.y[j]! + d * (t0y - t1y)) / 2,
  };
  return {
    joint,
    bulges: [
      halfTurn(t0x, t0y, joint.x - s.x[i]!, joint.y - s.y[i]!),
      halfTurn(s.x[j]! - joint.x, s.y[j]! - joint.y, t1x, t1y),
    ],
  };
}

interface Side {
  readonly x: number;
  readonly y: number;
  readonly bulge: number;
  readonly toX: number;
  readonly toY: number;
}

function distanceTo(side: Side): (x: number, y: number) => number {
  const dx = side.toX - side.x;
  const dy = side.toY - side.y;
  const chord = Math.hypot(dx, dy);
  if (side.bulge === 0) {
    return (x, y) => Math.abs((x - side.x) * dy - (y - side.y) * dx) / chord;
  }
  const { centre, radius } = arcOf(side, { x: side.toX, y: side.toY }, side.bulge);
  return (x, y) => Math.abs(Math.hypot(x - centre.x, y - centre.y) - radius);
}

/** Largest distance of the samples between i and j from the biarc. */
function deviationOf(s: CurveSamples, i: number, j: number, biarc: Biarc): number {
  const { joint, bulges } = biarc;
  const jx = s.x[j]!;
  const jy = s.y[j]!;
  const first = distanceTo({
    x: s.x[i]!,
    y: s.y[i]!,
    bulge: bulges[0],
    toX: joint.x,
    toY: joint.y,
  });
  const second = distanceTo({ x: joint.x, y: joint.y, bulge: bulges[1], toX: jx, toY: jy });
  // The bisecting direction at the joint tells which arc a sample belongs to.
  const nx = jx - s.x[i]!;
  const ny = jy - s.y[i]!;
  let worst = 0;
  for (let k = i + 1; k < j; k++) {
    const x = s.x[k]!;
    const y = s.y[k]!;
    const before = (x - joint.x) * nx + (y - joint.y) * ny < 0;
    worst = Math.max(worst, before ? first(x, y) : second(x, y));
  }
  return worst;
}

interface Stretch {
  readonly to: number;
  readonly biarc: Biarc;
  readonly deviation: number;
}

function longestStretch(s: CurveSamples, from: number, tolerance: number): Stretch {
  const last = s.x.length - 1;
  const tryTo = (to: number): Stretch => {
    const biarc = biarcBetween(s, from, to);
    return { to, biarc, deviation: deviationOf(s, from, to, biarc) };
  };
  const whole = tryTo(last);
  if (whole.deviation <= tolerance) return whole;
  // Two neighbouring samples always pass: there is nothing between them to miss.
  let best = tryTo(from + 1);
  let tooFar = last;
  for (let step = 2; from + step < last; step *= 2) {
    const attempt = tryTo(from + step);
    if (attempt.deviation > tolerance) {
      tooFar = from + step;
      break;
    }
    best = attempt;
  }
  while (tooFar - best.to > 1) {
    const attempt = tryTo((best.to + tooFar) >> 1);
    if (attempt.deviation > tolerance) tooFar = attempt.to;
    else best = attempt;
  }
  return best;
}

/** Joins neighbours that are one and the same arc, up to a half circle. */
function mergeArcs(vertices: Vertex[], end: { x: number; y: number }): Vertex[] {
  const merged: Vertex[] = [];
  vertices.forEach((vertex, i) => {
    const previous = merged[merged.length - 1];
    const next = vertices[i + 1] ?? end;
    if (previous && previous.bulge !== 0 && vertex.bulge !== 0) {
      const a = arcOf(previous, vertex, previous.bulge);
      const b = arcOf(vertex, next, vertex.bulge);
      const apart = Math.hypot(a.centre.x - b.centre.x, a.centre.y - b.centre.y);
      const sweep = a.sweep + b.sweep;
      if (apart < SAME_ARC && Math.abs(sweep) <= Math.PI + STRAIGHT) {
        merged[merged.length - 1] = { ...previous, bulge: Math.tan(sweep / 4) };
        return;
      }
    }
    merged.push(vertex);
  });
  return merged;
}

/** @param tolerance mm, largest distance of a sample from the arcs */
export function fitArcs(samples: CurveSamples, tolerance: number): FittedArcs {
  const last = samples.x.length - 1;
  const vertices: Vertex[] = [];
  let deviation = 0;
  for (let from = 0; from < last;) {
    const stretch = longestStretch(samples, from, tolerance);
    const { joint, bulges } = stretch.biarc;
    vertices.push(
      { x: samples.x[from]!, y: samples.y[from]!, bulge: bulges[0] },
      { x: joint.x, y: joint.y, bulge: bulges[1] },
    );
    deviation = Math.max(deviation, stretch.deviation);
    from = stretch.to;
  }
  const end = { x: samples.x[last]!, y: samples.y[last]! };
  return { vertices: mergeArcs(vertices, end), deviation };
}
