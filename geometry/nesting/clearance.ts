/** How near the parts of a layout really come: by their own lines and arcs, not by the grid. */

import { contoursApart, held, type Held } from '../cutting/apart';
import { firstHit } from '../cutting/meet';
import { sidesOf } from '../cutting/side';
import { contourBounds, type Bounds } from '../measure';
import type { Contour } from '../outline';
import type { Placement, UsedSheet } from './layout';
import { placedContour } from './placed';

interface Lying {
  readonly sheet: number;
  readonly bounds: Bounds;
  readonly sides: readonly Held[];
}

/** Distance of two boxes, mm; 0 where they overlap. */
function boxesApart(a: Bounds, b: Bounds): number {
  const dx = Math.max(0, a.minX - b.maxX, b.minX - a.maxX);
  const dy = Math.max(0, a.minY - b.maxY, b.minY - a.maxY);
  return Math.hypot(dx, dy);
}

/** Does the second part lie inside the first? Their contours don't cross. */
function holds(outer: Lying, inner: Lying): boolean {
  const point = inner.sides[0]!.side.from;
  const sides = outer.sides.map(({ side }) => side);
  const reach = outer.bounds.maxX - outer.bounds.minX + outer.bounds.maxY - outer.bounds.minY;
  // Inside, the first side met is met from within; any direction tells.
  const hit = firstHit(sides, point, { x: 0.8, y: 0.6 }, 2 * reach);
  if (!hit) return false;
  let crossings = 0;
  let from = point;
  for (let next = hit as typeof hit | null; next;) {
    crossings++;
    from = { x: from.x + 0.8 * next.distance, y: from.y + 0.6 * next.distance };
    next = firstHit(sides, from, { x: 0.8, y: 0.6 }, 2 * reach);
  }
  return crossings % 2 === 1;
}

export interface Clearance {
  /** mm; 0 where two parts meet or overlap. */
  readonly nearest: number | null;
  /** mm; negative where a part leaves its sheet. */
  readonly nearestEdge: number | null;
}

export function clearanceOf(
  outlines: ReadonlyMap<string, Contour>,
  placements: readonly Placement[],
  sheets: readonly UsedSheet[],
): Clearance {
  let nearest = Infinity;
  let nearestEdge = Infinity;
  const lying = placements.map((placement): Lying => {
    const contour = placedContour(outlines.get(placement.key)!, placement);
    const bounds = contourBounds(contour);
    const { width, height } = sheets[placement.sheet]!;
    nearestEdge = Math.min(
      nearestEdge,
      bounds.minX,
      bounds.minY,
      width - bounds.maxX,
      height - bounds.maxY,
    );
    return { sheet: placement.sheet, bounds, sides: sidesOf(contour).map(held) };
  });
  for (let i = 0; i < lying.length; i++) {
    for (let j = i + 1; j < lying.length; j++) {
      const a = lying[i]!;
      const b = lying[j]!;
      if (a.sheet !== b.sheet || boxesApart(a.bounds, b.bounds) >= nearest) continue;
      const apart = contoursApart(a.sides, b.sides);
      nearest = Math.min(nearest, holds(a, b) || holds(b, a) ? 0 : apart);
    }
  }
  return {
    nearest: Number.isFinite(nearest) ? nearest : null,
    nearestEdge: Number.isFinite(nearestEdge) ? nearestEdge : null,
  };
}
