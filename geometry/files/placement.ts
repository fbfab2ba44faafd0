import { contourBounds } from '../measure';
import type { CutPart } from '../parts/part';

/** What a cut file needs of a part. */
export interface FlatPart extends Pick<CutPart, 'key' | 'outside' | 'holes'> {
  /** Written beside it, on a layer that is not cut. */
  readonly words?: string;
}

/** A part and how far it is moved in a file, mm. */
export interface Placement {
  readonly part: FlatPart;
  readonly dx: number;
  readonly dy: number;
}

/** mm between parts laid out in one file. */
const BETWEEN = 10;

/** Lays parts side by side, the first as it is drawn. */
export function placeInRow(parts: readonly FlatPart[]): Placement[] {
  let edge: number | null = null;
  return parts.map((part) => {
    const { minX, maxX } = contourBounds(part.outside);
    const dx: number = edge === null ? 0 : edge + BETWEEN - minX;
    edge = dx + maxX;
    return { part, dx, dy: 0 };
  });
}
