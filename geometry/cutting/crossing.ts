/** Contours that cross or touch themselves: nothing can cut them. */

import type { Point } from '../outline';
import { atLeastApart, held } from './apart';
import { meetings } from './meet';
import { pointAt, SHORTEST, type Side } from './side';

const isEnd = ({ from, to }: Side, { x, y }: Point): boolean =>
  Math.min(Math.hypot(from.x - x, from.y - y), Math.hypot(to.x - x, to.y - y)) < SHORTEST;

/**
 * Where a closed contour meets itself, other than one side the next at their common end; null
 * where it doesn't.
 */
export function selfCrossing(sides: readonly Side[]): Point | null {
  const all = sides.map(held);
  for (const [i, a] of all.entries()) {
    for (let j = i + 1; j < all.length; j++) {
      const b = all[j]!;
      if (atLeastApart(a, b) > SHORTEST) continue;
      const neighbours = j === i + 1 || (i === 0 && j === all.length - 1);
      for (const [onA] of meetings(a.side, b.side)) {
        const at = pointAt(a.side, onA);
        if (!neighbours || !isEnd(a.side, at) || !isEnd(b.side, at)) return at;
      }
    }
  }
  return null;
}
