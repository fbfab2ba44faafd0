/**
 * The inverse: the blade whose plates have the law, edges and plan view counted.
 *
 *   T'(θ) = (r² − rc²)/(2g) + Fo·√(r² + r'²) + (Fc − Fh)·rc + d/dθ[radial edges + Z·plan view]
 *
 * with r taken where the rotor's curve crosses the stator's first edge, and less what leaves over
 * its last. Where the edges are set in, the crossing runs along the curve faster or slower than
 * the shaft turns, which the terms in √(r² + r'²) and in r' feel. T is the law over ε and per gap. Everything that depends weakly on the blade is taken
 * from the blade before; r' enters implicitly, since an explicit step would amplify ripples.
 */

import { bladeRadius, bladeSlope, type Blade } from './blade';
import type { CellField } from './field/cell-field';

export interface BladeProblem {
  /** d(total)/dθ over ε and per gap at a mesh angle within the law, mm/rad. */
  readonly wanted: (meshAngle: number) => number;
  /** Mesh angles between which the law holds, rad. */
  readonly from: number;
  readonly to: number;
  readonly rotorSector: number;
  readonly statorSector: number;
  /** mm */
  readonly airGap: number;
  readonly cutoutRadius: number;
  readonly edgeOffset: number;
  /** Smallest radius that the blade may take outside the law, mm. */
  readonly leastRadius: number;
}

/** Intervals over the blade. */
export const BLADE_STEPS = 300;

/** rad. Behind the law's end the blade's growth dies away within this. */
const FADE = (4 * Math.PI) / 180;

/** Root of r²/(2g) + b·r = c that is not negative; 0 where there is none. */
function radiusFrom(airGap: number, b: number, c: number): number {
  const root = b * b + (2 * c) / airGap;
  return root > 0 ? Math.max(0, airGap * (Math.sqrt(root) - b)) : 0;
}

/** Angle behind the stator's first edge at which a radius crosses it, when the edge is offset. */
function edgeAngle(offset: number, radius: number): number {
  return offset === 0
    ? 0
    : Math.asin(Math.min(1, Math.max(-1, offset / Math.max(radius, 1e-9))));
}

/** How fast a crossing with an edge set in by an offset runs along the curve, per shaft angle. */
function crossingRate(offset: number, radius: number, slope: number): number {
  if (offset === 0) return 1;
  const along = Math.sqrt(Math.max(radius * radius - offset * offset, 1e-9));
  return 1 / Math.max(0.2, 1 - (offset * slope) / (radius * along));
}

/** Blade of the textbook: area and outer edge alone, to start from. */
export function firstBlade(problem: BladeProblem, outerEdge: number): Blade {
  const { airGap, cutoutRadius: rc, rotorSector, from, to } = problem;
  const radius = Float64Array.from({ length: BLADE_STEPS + 1 }, (_, i) => {
    const phi = (rotorSector * i) / BLADE_STEPS;
    const angle = Math.min(Math.max(phi, from), to);
    const r = radiusFrom(airGap, outerEdge, problem.wanted(angle) + (rc * rc) / (2 * airGap));
    return Math.max(r, problem.leastRadius);
  });
  return { sector: rotorSector, radius };
}

/** One step: the blade that has the law if all weak terms are those of the blade before. */
export function nextBlade(problem: BladeProblem, before: Blade, field: CellField): Blade {
  const { airGap: g, cutoutRadius: rc, rotorSector, statorSector, edgeOffset } = problem;
  const { outerEdge, cutoutUnderBlade, besideBlade, coveredEdge, slopeOfRest } = field;
  const slope = bladeSlope(before);
  const step = rotorSector / BLADE_STEPS;
  const radius = new Float64Array(BLADE_STEPS + 1);
  let first = -1;
  let last = -1;
  for (let i = 0; i <= BLADE_STEPS; i++) {
    const phi = i * step;
    const r0 = before.radius[i]!;
    const meshAngle = phi + edgeAngle(edgeOffset, r0);
    if (meshAngle < problem.from - step / 2 || meshAngle > problem.to + step / 2) continue;
    const within = Math.min(Math.max(meshAngle, problem.from), problem.to);
    let wanted = problem.wanted(within) - slopeOfRest(within);
    const leading = before.radius[0]!;
    const leaving = meshAngle - statorSector + edgeAngle(edgeOffset, leading);
    if (leaving <= 0) wanted -= (cutoutUnderBlade - besideBlade) * rc;
    else {
      // What leaves was solved some steps ago: it may be of this blade already.
      const solved = first >= 0 && leaving >= (first + 1) * step;
      const out = bladeRadius(solved ? { sector: rotorSector, radius } : before, leaving);
      const outSlope = slope[Math.min(Math.round(leaving / step), BLADE_STEPS)]!;
      const outRate = crossingRate(-edgeOffset, out, outSlope);
      wanted +=
        (out * out - rc * rc) / (2 * g) + outerEdge * outRate * Math.hypot(out, outSlope);
    }
    const dr0 = slope[i]!;
    const side = Math.hypot(r0, dr0) || 1;
    // Length of the outer edge, linear about the blade before: (r0·r + r0'·r')/side.
    const rate = crossingRate(edgeOffset, r0, dr0);
    const perSlope = rate * (coveredEdge + (outerEdge * dr0) / side);
    const perRadius = (rate * outerEdge * r0) / side;
    const known = wanted + (rc * rc) / (2 * g);
    if (first < 0 || perSlope <= 0) {
      if (first < 0) first = i;
      radius[i] = radiusFrom(g, perRadius, known - perSlope * dr0);
    } else if (i - first === 1) {
      radius[i] = radiusFrom(
        g,
        perRadius + perSlope / step,
        known + (perSlope * radius[i - 1]!) / step,
      );
    } else {
      const back = (4 * radius[i - 1]! - radius[i - 2]!) / (2 * step);
      radius[i] = radiusFrom(g, perRadius + (1.5 * perSlope) / step, known + perSlope * back);
    }
    last = i;
  }
  // Run in: straight on from the law's beginning. Run out: the growth fades.
  const startSlope = (radius[first + 2]! - radius[first]!) / (2 * step);
  for (let i = 0; i < first; i++) {
    radius[i] = Math.max(problem.leastRadius, radius[first]! - startSlope * (first - i) * step);
  }
  const endSlope = (radius[last]! - radius[last - 2]!) / (2 * step);
  for (let i = last + 1; i <= BLADE_STEPS; i++) {
    const past = Math.min((i - last) * step, FADE);
    radius[i] = Math.max(
      problem.leastRadius,
      radius[last]! + endSlope * (past - (past * past) / (2 * FADE)),
    );
  }
  return { sector: rotorSector, radius };
}
