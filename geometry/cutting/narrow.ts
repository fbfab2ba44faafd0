/** The narrowest place beside a contour: of the metal within it, or of the air without. */

import type { Point } from '../outline';
import { atLeastApart, held, sidesApart } from './apart';
import { firstHit } from './meet';
import { distanceToSides, normalAt, pointAt, sideLength, type Side } from './side';

/** A place and its width, mm. */
export interface Narrow extends Point {
  readonly width: number;
}

/** Walls count as facing each other up to 30° from parallel. */
const FACING = -Math.cos(Math.PI / 6);

/** Where along each side the way across is measured. */
const PLACES = [0.02, 0.25, 0.5, 0.75, 0.98];

/** mm */
const ROUNDING = 1e-6;

/** Direction out of the contour at a fraction of a side; at a corner, between those of its sides. */
function outwards(sides: readonly Side[], index: number, fraction: number): Point {
  const own = normalAt(sides[index]!, fraction);
  if (fraction > 0 && fraction < 1) return own;
  const n = sides.length;
  const other =
    fraction === 0
      ? normalAt(sides[(index + n - 1) % n]!, 1)
      : normalAt(sides[(index + 1) % n]!, 0);
  return { x: own.x + other.x, y: own.y + other.y };
}

/** Across between walls that face each other. */
function betweenWalls(sides: readonly Side[], towards: 1 | -1): Narrow | null {
  const reach = sides.reduce((sum, side) => sum + sideLength(side), 0);
  let best: Narrow | null = null;
  for (const side of sides) {
    for (const fraction of PLACES) {
      const at = pointAt(side, fraction);
      const normal = normalAt(side, fraction);
      const direction = { x: normal.x * towards, y: normal.y * towards };
      const hit = firstHit(sides, at, direction, best?.width ?? reach);
      if (!hit || (best && hit.distance >= best.width)) continue;
      const other = normalAt(hit.side, hit.fraction);
      if (normal.x * other.x + normal.y * other.y > FACING) continue;
      const half = hit.distance / 2;
      best = {
        x: at.x + direction.x * half,
        y: at.y + direction.y * half,
        width: hit.distance,
      };
    }
  }
  return best;
}

/**
 * Narrowest place on one side of a closed contour, mm; null where nothing faces anything.
 * @param sides counter-clockwise
 * @param towards 1 for slots and necks of the air outside, −1 for webs of what is inside
 */
export function narrowest(sides: readonly Side[], towards: 1 | -1): Narrow | null {
  let best = betweenWalls(sides, towards);
  const all = sides.map(held);
  for (let i = 0; i < sides.length; i++) {
    for (let j = i + 2; j < sides.length; j++) {
      if (i === 0 && j === sides.length - 1) continue;
      const limit: number = best?.width ?? Infinity;
      if (atLeastApart(all[i]!, all[j]!) >= limit) continue;
      const { distance, onFirst, onSecond } = sidesApart(sides[i]!, sides[j]!);
      if (distance >= limit || distance < ROUNDING) continue;
      const p = pointAt(sides[i]!, onFirst);
      const q = pointAt(sides[j]!, onSecond);
      const out = outwards(sides, i, onFirst);
      if (((q.x - p.x) * out.x + (q.y - p.y) * out.y) * towards <= 0) continue;
      const back = outwards(sides, j, onSecond);
      if (((p.x - q.x) * back.x + (p.y - q.y) * back.y) * towards <= 0) continue;
      // A true neck: nothing is nearer to its middle than its two ends.
      const middle = { x: (p.x + q.x) / 2, y: (p.y + q.y) / 2 };
      if (distanceToSides(sides, middle) < distance / 2 - ROUNDING) continue;
      best = { ...middle, width: distance };
    }
  }
  return best;
}
