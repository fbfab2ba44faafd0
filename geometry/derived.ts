/** What the kernel makes of a design. Plain data: it crosses worker and JSON borders as it is. */

import type { Design } from './design';
import type { Finding } from './finding';
import type { Circle, Contour } from './outline';

export type PlateRole = 'rotor' | 'stator';

/**
 * A plate as it will be cut, mm. The rotor is drawn at mesh angle 0: leading edge along +x, the
 * blade behind it. The stator is drawn where it stands, its first edge along +x. Both are
 * mirrored in x where the rotor meshes clockwise.
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
  /** Which stator of the section it carries. */
  readonly stator: number;
  readonly x: number;
  readonly y: number;
  readonly holeRadius: number;
  readonly spacerRadius: number;
  /** Smallest distance from the spacer to the sweep of the rotor, mm; negative is a hit. */
  readonly clearance: number;
}

/** Which field the figures hold: plate edges alone, or edges and plan view. */
export type FieldModel = 'edges' | 'field';

/**
 * Capacitance over the whole travel, from the finished outlines. All arrays have the same length;
 * target and error are null in the rests before and after the law.
 */
export interface LawCheck {
  /** Shaft angle from the open stop, rad, ascending; both ends of the law are among them. */
  readonly angle: readonly number[];
  /** Total capacitance the law asks for, F. */
  readonly target: readonly (number | null)[];
  /** Total capacitance the finished plates give, trimmer, frame and stray included, F. */
  readonly achieved: readonly number[];
  /** What the overlap's area alone would give, counted from the law's beginning, F. */
  readonly areaOnly: readonly number[];
  /** achieved − target, F. */
  readonly error: readonly (number | null)[];
  /** Shaft angles between which the law holds, rad. */
  readonly from: number;
  readonly to: number;
  /** Largest |error| over the whole law. */
  readonly largestError: LawError;
  /** The same between 5 % and 95 % of the law. */
  readonly largestInner: LawError;
  /** Capacitance to the second stator with its frame allowance, F, where there is one. */
  readonly other: readonly number[] | null;
  /** First shaft angle within the law at which the capacitance does not rise, or null. */
  readonly fallsAt: number | null;
}

export interface LawError {
  /** As a fraction of the capacitance range. */
  readonly fraction: number;
  /** F, signed. */
  readonly capacitance: number;
  /** rad */
  readonly angle: number;
}

export interface SectionResult {
  /** Total capacitance at the beginning and the end of the law, which the law acts on, F. */
  readonly totalMin: number;
  readonly totalMax: number;
  /** What the section itself, with its trimmer, must measure there, F. */
  readonly ownMin: number;
  readonly ownMax: number;
  readonly stray: number;
  /** What the plates alone have at the open stop and at the beginning of the law, F. */
  readonly platesOpen: number;
  readonly platesAtLaw: number;
  /** Allowance for insulators and frame, F. */
  readonly frame: number;
  /** What a trimmer has to add to bring the beginning of the law to its target, F; 0 at least. */
  readonly trimmer: number;
  /** Coil inductance when a band is given, H. */
  readonly inductance: number | null;
  /** Gaps between facing plates of one blade and its stator. */
  readonly gaps: number;
  /** Where the stators stand in plan, rad from the one that is drawn. */
  readonly statorAngles: readonly number[];
  /** Between what the capacitance is counted. */
  readonly terminals: string;
  /** mm */
  readonly airGap: number;
  /** Air gap that has the capacitance of the gap with its film or disc, mm. */
  readonly electricalGap: number;
  readonly model: FieldModel;
  readonly statorForm: 'even' | 'following';
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
  /** Which set of plates of its section. */
  readonly pack: number;
  /** How far it is turned from the plate as drawn, rad. */
  readonly angle: number;
  /** Middle of the plate along the shaft, mm, from the first face of the stack. */
  readonly z: number;
  readonly thickness: number;
}

export interface StackSpacer {
  readonly role: PlateRole;
  readonly section: number;
  readonly pack: number;
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

/** How the shaft turns. */
export interface Turn {
  /** Shaft rotation from the open to the meshed stop, rad. */
  readonly travel: number;
  /** Shaft angles at which the law begins and ends, from the open stop, rad. */
  readonly lawFrom: number;
  readonly lawTo: number;
  /**
   * Mesh angle at the open stop: 0 where the leading edge stands over the stator's first edge,
   * negative while it is short of it. At the meshed stop the trailing edge stands over it.
   */
  readonly meshAtOpen: number;
  /** 1 where the rotor meshes turning counter-clockwise as drawn, −1 where clockwise. */
  readonly direction: 1 | -1;
}

export interface Derived {
  readonly kernel: string;
  readonly design: Design;
  readonly turn: Turn;
  readonly sections: readonly SectionResult[];
  readonly stack: Stack;
  readonly findings: readonly Finding[];
}

/** Plates, or the findings that say why there are none. */
export type Derivation =
  | { readonly ok: true; readonly derived: Derived }
  | { readonly ok: false; readonly findings: readonly Finding[] };
