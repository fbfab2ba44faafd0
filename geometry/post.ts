/** Posts that carry the stator: where they stand and how far the rotor stays from them. */

import { arrangementOf, passesOf } from './arrangement';
import { bladeRadius, type Blade } from './blade';
import type { Design } from './design';
import type { Post, Turn } from './derived';
import type { EarShape } from './ear';
import { polar } from './polar';

/** Distance from a point to the sweep of one blade, mm; negative inside it. */
function distanceToBlade(blade: Blade, turn: Turn, radius: number, angle: number): number {
  const last = blade.radius.length - 1;
  let nearest = Infinity;
  let covered = 0;
  for (let i = 0; i <= last; i++) {
    const phi = (blade.sector * i) / last;
    const r = blade.radius[i]!;
    const from = turn.meshAtOpen - phi;
    // Angle from the arc's start, once round.
    const along = (((angle - from) % (2 * Math.PI)) + 2 * Math.PI) % (2 * Math.PI);
    const past = along <= turn.travel ? 0 : Math.min(along - turn.travel, 2 * Math.PI - along);
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

/**
 * Smallest distance from a point in the stator's frame to the rotor's sweep, mm; negative inside
 * it. Each point of the blade sweeps an arc, from its place at the open stop to the meshed.
 * @param passes angles apart at which a blade passes: with two blades or two stators also half a
 *   turn away
 */
export function distanceToSweep(
  blade: Blade,
  turn: Turn,
  passes: readonly number[],
  radius: number,
  angle: number,
): number {
  return Math.min(
    ...passes.map((apart) => distanceToBlade(blade, turn, radius, angle + apart)),
  );
}

/** Nearest distance of a post from the shaft that keeps a clearance from the sweep, mm. */
function nearestRadius(
  blade: Blade,
  turn: Turn,
  passes: readonly number[],
  angle: number,
  clearance: number,
): number {
  let radius = bladeRadius(blade, blade.sector - angle) + clearance;
  for (let pass = 0; pass < 30; pass++) {
    const short = clearance - distanceToSweep(blade, turn, passes, radius, angle);
    if (short <= 1e-9) break;
    radius += short;
  }
  return radius;
}

/**
 * An ear for each post, spread evenly over the stator. Unless the design sets their circle, posts
 * stand as near the shaft as the clearance allows: on one circle beside an even stator, each for
 * itself beside one that follows the rotor.
 */
export function layOutEars(
  design: Design,
  turn: Turn,
  blade: Blade,
  form: 'even' | 'following',
): EarShape[] {
  const { postCount, statorSector } = design;
  const earRadius = design.postHoleDiameter / 2 + design.postWeb;
  const clearance = design.postClearance + design.postSpacerRadius;
  const angles = Array.from(
    { length: postCount },
    (_, i) => (statorSector * (i + 0.5)) / postCount,
  );
  const passes = passesOf(arrangementOf(design));
  const own = angles.map((angle) => nearestRadius(blade, turn, passes, angle, clearance));
  const furthest = Math.max(...own);
  return angles.map((angle, i) => ({
    angle,
    earRadius,
    circleRadius: design.postCircleRadius ?? (form === 'even' ? furthest : own[i]!),
  }));
}

/** The posts of all stators. */
export function standPosts(
  design: Design,
  turn: Turn,
  ears: readonly EarShape[],
  blade: Blade,
): Post[] {
  const arrangement = arrangementOf(design);
  const passes = passesOf(arrangement);
  return arrangement.stators.flatMap((standsAt, stator) =>
    ears.map(({ angle, circleRadius }) => ({
      ...polar(circleRadius, angle + standsAt),
      stator,
      holeRadius: design.postHoleDiameter / 2,
      spacerRadius: design.postSpacerRadius,
      clearance:
        distanceToSweep(blade, turn, passes, circleRadius, angle) - design.postSpacerRadius,
    })),
  );
}
