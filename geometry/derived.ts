/** What the kernel makes of a design. Plain data: it crosses worker and JSON borders as it is. */

import type { Design } from './design';
import type { Finding } from './finding';
import type { Circle, Contour } from './outline';

export type PlateRole = 'rotor' | 'stator';

/**
 * A plate as it will be cut, mm. The rotor is drawn at mesh angle 0: leading edge along +x,
 * blade behind it (clockwise); it turns counter-clockwise to mesh. The stator is drawn where it
 * stands, from +x counter-clockwise through the travel.
 */
export interface Plate {
  readonly role: PlateRole;
  readonly section: number;
  readonly outside: Contour;
  readonly holes: readonly Circle[];
  readonly thickness: number;
  readonly quantity: number;
  /** Face area of one plate, holes taken out, mm². */
  readonly area: number;
  /** Length of all contours of one plate, mm. */
  readonly cutLength: number;
  /** Mass of one plate, g. */
  readonly mass: number;
  /** Largest distance found between the solved curve and the arcs that are cut, mm. */
  readonly fitDeviation: number;
}

export interface Post {
  readonly x: number;
  readonly y: number;
  readonly holeRadius: number;
  readonly spacerRadius: number;
  /** Smallest distance from the spacer to the sweep of the rotor, mm; negative is a hit. */
  readonly clearance: number;
}

/** The law over the travel, from the finished outlines. All arrays have the same length. */
export interface LawCheck {
  /** Mesh angle, rad, from 0 to the travel. */
  readonly angle: readonly number[];
  /** Total capacitance the law asks for, F. */
  readonly target: readonly number[];
  /** Total capacitance the finished plates give, F. */
  readonly achieved: readonly number[];
  /** achieved − target, F. */
  readonly error: readonly number[];
  /** Largest |error| as a fraction of the capacitance range, and where. */
  readonly largestError: {
    readonly fraction: number;
    readonly capacitance: number;
    readonly angle: number;
  };
}

export interface SectionResult {
  /** Total capacitance open and meshed, which the law acts on, F. */
  readonly totalMin: number;
  readonly totalMax: number;
  /** What the section itself, with its trimmer, must measure open and meshed, F. */
  readonly ownMin: number;
  readonly ownMax: number;
  readonly stray: number;
  /** Coil inductance when a band is given, H. */
  readonly inductance: number | null;
  /** Gaps between facing plates. */
  readonly gaps: number;
  readonly rotor: Plate;
  readonly stator: Plate;
  readonly posts: readonly Post[];
  readonly law: LawCheck;
  /** Longest rotor radius, mm. */
  readonly sweepRadius: number;
  /** Narrowest blade over the hub, mm. */
  readonly narrowestBlade: number;
  readonly rotorSpacer: number;
  readonly statorSpacer: number;
}

export interface StackPlate {
  readonly role: PlateRole;
  readonly section: number;
  /** Middle of the plate along the shaft, mm, from the first face of the stack. */
  readonly z: number;
  readonly thickness: number;
}

export interface StackSpacer {
  readonly role: PlateRole;
  readonly section: number;
  readonly z: number;
  readonly length: number;
}

export interface Stack {
  readonly plates: readonly StackPlate[];
  /** Spacers between neighbouring plates of one role; stator ones stand on every post. */
  readonly spacers: readonly StackSpacer[];
  /** Over all plates, mm. */
  readonly depth: number;
  /** Largest rotor radius of any section, mm. */
  readonly sweepRadius: number;
  /** From the shaft to the furthest point of any plate, mm. */
  readonly outerRadius: number;
  /** Mass of all plates, g; without spacers, shaft and posts. */
  readonly mass: number;
  /** Length of all cuts of all plates, mm. */
  readonly cutLength: number;
}

export interface Derived {
  readonly kernel: string;
  readonly design: Design;
  readonly sections: readonly SectionResult[];
  readonly stack: Stack;
  readonly findings: readonly Finding[];
}

/** Plates, or the findings that say why there are none. */
export type Derivation =
  | { readonly ok: true; readonly derived: Derived }
  | { readonly ok: false; readonly findings: readonly Finding[] };
