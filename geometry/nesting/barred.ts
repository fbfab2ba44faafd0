/**
 * Places barred to one part by another: the Minkowski sum of the one and the other turned about
 * its origin, on the grid (T. Lozano-Pérez, "Spatial planning", IEEE Trans. Computers C-32, 1983,
 * from memory).
 */

import type { Cover } from './cover';

/** Barred offsets of the second cover from the first, column by column from `first`. */
export interface Barred {
  /** Offset of the first column, at most 0. */
  readonly first: number;
  /** For each column its stretches of barred offsets along y. */
  readonly columns: readonly Int32Array[];
}

export function barredBy(placed: Cover, coming: Cover): Barred {
  const first = 1 - coming.width;
  const lowest = 1 - coming.height;
  const steps = new Int32Array(placed.height + coming.height);
  const columns = Array.from({ length: placed.width + coming.width - 1 }, (_, k) => {
    steps.fill(0);
    const offset = k + first;
    const from = Math.max(0, offset);
    const to = Math.min(placed.width - 1, coming.width - 1 + offset);
    for (let i = from; i <= to; i++) {
      const a = placed.columns[i]!;
      const b = coming.columns[i - offset]!;
      for (let p = 0; p < a.length; p += 2) {
        for (let q = 0; q < b.length; q += 2) {
          // Offsets at which the two stretches share a cell.
          steps[a[p]! - b[q + 1]! - lowest]!++;
          steps[a[p + 1]! - b[q]! - lowest + 1]!--;
        }
      }
    }
    const ends: number[] = [];
    let depth = 0;
    for (let y = 0; y < steps.length; y++) {
      const before = depth;
      depth += steps[y]!;
      if (before === 0 && depth > 0) ends.push(y + lowest);
      if (before > 0 && depth === 0) ends.push(y + lowest - 1);
    }
    return Int32Array.from(ends);
  });
  return { first, columns };
}
