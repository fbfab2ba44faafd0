import type { Law } from './law';
import { RADIUS_SETTLED } from './tolerances';

/** Samples of the rotor's outer curve, by angle φ behind the leading edge. mm and rad. */
export interface RotorCurve {
  readonly phi: Float64Array;
  readonly radius: Float64Array;
  /** dr/dφ, mm/rad. */
  readonly slope: Float64Array;
}

export interface CurveInput {
  readonly law: Law;
  /** rad */
  readonly travel: number;
  /** ε·n, permittivity times the number of gaps, F/mm. */
  readonly permittivityGaps: number;
  /** mm */
  readonly airGap: number;
  readonly cutoutRadius: number;
  /** Edge factors of the rotor's outer curve and of the stator's cut-out. */
  readonly rotorEdge: number;
  readonly statorEdge: number;
  /** Intervals over the travel. */
  readonly steps: number;
}

/**
 * The rotor curve whose finished edge has the law:
 *
 *   dC/dθ = ε·n·[(r² − rc²)/(2g) + Fr·√(r² + r'²) + Fs·rc]
 *
 * The first term is the swept area; the others are the gain of the rotor's outer edge, along its
 * true length, and of the cut-out's edge. A radius may come out at or below the cut-out, or not
 * at all (0): the caller decides what that means.
 */
export function solveRotorCurve(input: CurveInput): RotorCurve {
  const { law, travel, permittivityGaps, airGap, cutoutRadius: rc, steps } = input;
  const phi = new Float64Array(steps + 1);
  const radius = new Float64Array(steps + 1);
  const slope = new Float64Array(steps + 1);
  for (let i = 0; i <= steps; i++) {
    const x = i / steps;
    phi[i] = travel * x;
    const wanted = law.slope(x) / (permittivityGaps * travel);
    const wantedSlope = law.curvature(x) / (permittivityGaps * travel * travel);
    const rest = wanted - input.statorEdge * rc + (rc * rc) / (2 * airGap);
    // r²/(2g) + Fr·q·r = rest, with q = √(1 + (r'/r)²) settled by iteration.
    let q = 1;
    let r = 0;
    for (let pass = 0; pass < 20; pass++) {
      const edge = input.rotorEdge * q;
      const root = edge * edge + (2 * rest) / airGap;
      const next = root > 0 ? Math.max(0, airGap * (Math.sqrt(root) - edge)) : 0;
      const moved = Math.abs(next - r);
      r = next;
      if (r === 0) break;
      slope[i] = wantedSlope / (r / airGap + edge);
      q = Math.hypot(1, slope[i]! / r);
      if (moved < RADIUS_SETTLED) break;
    }
    radius[i] = r;
  }
  return { phi, radius, slope };
}
