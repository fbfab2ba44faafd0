/** Everything that goes into a built capacitor: what is cut, what is turned, what is bought. */

import type { Material } from '../material';
import type { Circle, Contour } from '../outline';

interface AnyPart {
  /** Stable within a design, plain letters, digits and hyphens: `s1-rotor`. In names of files. */
  readonly key: string;
  /** As a person calls it: `Rotor plate, section 1`. */
  readonly label: string;
  /** null for what all sections share. */
  readonly section: number | null;
  /** Pieces in one capacitor. */
  readonly quantity: number;
  /** For drawing and list of parts; empty if there is nothing to say. */
  readonly note: string;
}

/** A flat part cut from sheet. mm, mm², g; the contours are nominal. */
export interface CutPart extends AnyPart {
  readonly kind: 'cut';
  readonly material: Material | 'insulator';
  readonly thickness: number;
  readonly outside: Contour;
  readonly holes: readonly (Circle | Contour)[];
  /** Area of one face, holes taken out; length of all contours; mass of one piece. */
  readonly area: number;
  readonly cutLength: number;
  readonly mass: number;
}

/** A turned ring: a spacer. mm, g. */
export interface TurnedPart extends AnyPart {
  readonly kind: 'turned';
  readonly material: string;
  readonly outerDiameter: number;
  readonly boreDiameter: number;
  readonly length: number;
  readonly mass: number;
}

/** Bought in: shaft, rod, screws, nuts, bearings. */
export interface BoughtPart extends AnyPart {
  readonly kind: 'bought';
  /** Size as one orders it: `Ø 6 g6 × 92`, `M3 × 60`. */
  readonly size: string;
}

export type Part = CutPart | TurnedPart | BoughtPart;
