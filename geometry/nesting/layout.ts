/** What a layout on sheets is asked and what it gives. mm, rad. */

import type { Contour } from '../outline';

/** A part to be laid out: its nominal outline and how many. */
export interface Piece {
  readonly key: string;
  readonly outside: Contour;
  readonly quantity: number;
}

/** A kind of sheet in store. */
export interface Stock {
  readonly width: number;
  readonly height: number;
  readonly count: number;
}

export interface LayoutSettings {
  /** Least distance between two parts, and from a part to the sheet's edge. */
  readonly gap: number;
  readonly margin: number;
  /** Rotations tried, evenly over a turn; 1 leaves every part as it is drawn. */
  readonly rotations: number;
}

/** One part on its sheet: turned about its own origin, which then comes to x, y. */
export interface Placement {
  readonly key: string;
  readonly sheet: number;
  readonly x: number;
  readonly y: number;
  readonly angle: number;
}

export interface UsedSheet {
  /** Which kind of sheet in store. */
  readonly stock: number;
  readonly width: number;
  readonly height: number;
  /** How much of the width is taken, margin included; the rest can go back into store. */
  readonly used: number;
}

export interface Layout {
  readonly placements: readonly Placement[];
  readonly sheets: readonly UsedSheet[];
  /** Parts that the sheets had no room for. */
  readonly left: readonly { readonly key: string; readonly quantity: number }[];
  /** Smallest distance found between two parts, exact; null for one part alone on each sheet. */
  readonly nearest: number | null;
  /** Smallest distance found from a part to an edge of its sheet, exact; null for no part. */
  readonly nearestEdge: number | null;
}
