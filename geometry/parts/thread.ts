/**
 * ISO 273 clearance holes, fine and medium series, mm. M3 and M4 published; the others from memory.
 */
const clearance: readonly (readonly [size: number, fine: number, medium: number])[] = [
  [1.6, 1.7, 1.8],
  [2, 2.2, 2.4],
  [2.5, 2.7, 2.9],
  [3, 3.2, 3.4],
  [4, 4.3, 4.5],
  [5, 5.3, 5.5],
  [6, 6.4, 6.6],
  [8, 8.4, 9],
  [10, 10.5, 11],
  [12, 13, 13.5],
];

/** Largest metric thread that passes a hole with fine clearance; null for none. */
export function threadThrough(hole: number): number | null {
  return clearance.reduce<number | null>(
    (best, [size, fine]) => (fine <= hole + 1e-9 ? size : best),
    null,
  );
}

/** Medium clearance hole of a metric thread. @throws RangeError for one that isn't listed */
export function clearanceHole(size: number): number {
  const row = clearance.find(([listed]) => listed === size);
  if (!row) throw new RangeError(`invalid thread: M${size}`);
  return row[2];
}
