/** Posts that carry the stator: where they stand and how far the rotor stays from them. */

import type { Design } from './design';
import type { Post } from './derived';
import { polar } from './polar';
import type { RotorCurve } from './rotor-curve';

export interface PostLayout {
  /** Distance of the posts from the shaft, mm. */
  readonly circleRadius: number;
  /** Radius of the metal round a post's centre, mm. */
  readonly earRadius: number;
  /** Angle of each post, rad, ascending. */
  readonly angles: readonly number[];
}

/** Angle that an ear covers to either side of its post, rad. */
export function earHalfAngle(layout: PostLayout, statorRadius: number): number {
  const { circleRadius: rp, earRadius: re } = layout;
  const fromArc = Math.asin(Math.min(1, re / statorRadius));
  const fromPost = rp > re ? Math.asin(re / rp) : Math.PI / 2;
  return Math.max(fromArc, fromPost);
}

/**
 * Posts spread evenly over the stator, as near the shaft as the clearance allows unless the
 * design sets their circle.
 * @param sweepRadius longest rotor radius, mm
 */
export function layOutPosts(design: Design, sweepRadius: number): PostLayout {
  const { postCount, travel } = design;
  const earRadius = design.postHoleDiameter / 2 + design.postWeb;
  return {
    circleRadius:
      design.postCircleRadius ?? sweepRadius + design.postClearance + design.postSpacerRadius,
    earRadius,
    angles: Array.from({ length: postCount }, (_, i) => (travel * (i + 0.5)) / postCount),
  };
}

/**
 * Smallest distance from a point in the stator's frame to the rotor's sweep, mm; negative
 * inside it. Each point of the rotor curve sweeps an arc, from its place when open through the
 * travel.
 */
function distanceToSweep(curve: RotorCurve, radius: number, angle: number): number {
  const travel = curve.phi[curve.phi.length - 1]!;
  let nearest = Infinity;
  let covered = 0;
  for (let i = 0; i < curve.phi.length; i++) {
    const phi = curve.phi[i]!;
    const r = curve.radius[i]!;
    const past = Math.max(-phi - angle, angle - (travel - phi), 0);
    if (past === 0) {
      covered = Math.max(covered, r);
      nearest = Math.min(nearest, Math.abs(radius - r));
    } else {
      // Law of cosines to the end of the arc.
      const square = radius * radius + r * r - 2 * radius * r * Math.cos(past);
      nearest = Math.min(nearest, Math.sqrt(Math.max(0, square)));
    }
  }
  return radius <= covered ? -nearest : nearest;
}

export function standPosts(design: Design, layout: PostLayout, curve: RotorCurve): Post[] {
  return layout.angles.map((angle) => ({
    ...polar(layout.circleRadius, angle),
    holeRadius: design.postHoleDiameter / 2,
    spacerRadius: design.postSpacerRadius,
    clearance: distanceToSweep(curve, layout.circleRadius, angle) - design.postSpacerRadius,
  }));
}
