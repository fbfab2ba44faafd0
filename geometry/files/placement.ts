import type { Plate } from '../derived';
import { contourBounds } from '../measure';

/** A plate and how far it is moved in a file, mm. */
export interface Placement {
  readonly plate: Plate;
  readonly dx: number;
  readonly dy: number;
}

/** mm between plates laid out in one file. */
const BETWEEN = 10;

/** Lays plates side by side, the first with the shaft at the origin. */
export function placeInRow(plates: readonly Plate[]): Placement[] {
  let edge: number | null = null;
  return plates.map((plate) => {
    const { minX, maxX } = contourBounds(plate.outside);
    const dx: number = edge === null ? 0 : edge + BETWEEN - minX;
    edge = dx + maxX;
    return { plate, dx, dy: 0 };
  });
}
