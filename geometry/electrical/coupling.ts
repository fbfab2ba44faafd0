/**
 * How much neighbouring sections act on each other through the room between them: an estimate, for
 * rotors that are earthed. Posts, wiring and the frame's edges are not in it.
 */

import { EPSILON_0 } from '../constants';
import type { Derived, SectionResult } from '../derived';
import { screenHole, screenRooms } from '../parts/screens';

export interface Coupling {
  /** Index of the section before; the other is the next one. */
  readonly section: number;
  /** Between the stator faces that look at each other, rotor turned out, mm. */
  readonly distance: number;
  /** Common face, mm². */
  readonly face: number;
  /** Stator to stator without a screen, at the open stop, where it is largest, F. */
  readonly unscreened: number;
  /** With an earthed screen midway: what its holes let through, at most, F. */
  readonly screened: number;
  /** What the design has, F. */
  readonly capacitance: number;
  /** That over the geometric mean of both circuits' least totals. */
  readonly coefficient: number;
  /** Does an earthed rotor plate stand between the two stators when meshed? */
  readonly shieldedMeshed: boolean;
}

/**
 * Two thin discs of this face at this distance, F: area and edge (Kirchhoff 1877, from memory).
 * @param face mm²
 * @param distance mm
 */
export function facingPlates(face: number, distance: number): number {
  const radius = Math.sqrt(face / Math.PI);
  const edge = radius * (Math.log((16 * Math.PI * radius) / distance) - 1);
  return EPSILON_0 * (face / distance + Math.max(0, edge));
}

/**
 * Through a round hole in a thin earthed plate, charge on one side per volt on the other, F: the
 * hole's electric polarizability is 2a³/3 (H. A. Bethe 1944, from memory), the fields those of
 * plates at these distances. Too much where the hole is no smaller than the distances; then never
 * more than the plates have through the hole's own area.
 * @param radius mm
 */
export function throughHole(radius: number, before: number, after: number): number {
  const polarizability = (2 / 3) * radius ** 3;
  const open = (Math.PI * radius * radius) / (before + after);
  return EPSILON_0 * Math.min(polarizability / (before * after), open);
}

/** The outermost stator face of a section towards the shaft's front or back, mm along it. */
function statorFace({ stack }: Derived, section: number, towards: 'front' | 'back'): number {
  const faces = stack.plates
    .filter((plate) => plate.section === section && plate.role === 'stator')
    .map(({ z, thickness }) => (towards === 'front' ? z + thickness / 2 : z - thickness / 2));
  return towards === 'front' ? Math.max(...faces) : Math.min(...faces);
}

function endsInRotor({ stack }: Derived, section: number, towards: 'front' | 'back'): boolean {
  const own = stack.plates.filter((plate) => plate.section === section);
  const sign = towards === 'front' ? 1 : -1;
  return own.reduce((a, b) => (sign * b.z > sign * a.z ? b : a)).role === 'rotor';
}

/** Between every two neighbouring sections of a design. */
export function couplingsOf(derived: Derived): Coupling[] {
  const { design, sections } = derived;
  const screens = screenRooms(derived);
  // Screened as it would be: half the room, less the plate where there is one.
  const thickness = design.screens === 'between' ? design.screenThickness : 0;
  return sections.slice(1).map((next: SectionResult, section): Coupling => {
    const before = sections[section]!;
    const from = statorFace(derived, section, 'front');
    const to = statorFace(derived, section + 1, 'back');
    const distance = to - from;
    const face = Math.min(before.stator.area, next.stator.area);
    const unscreened = facingPlates(face, distance);
    const middle = screens[section]
      ? (screens[section].from + screens[section].to) / 2
      : (from + to) / 2;
    const sides = [middle - thickness / 2 - from, to - middle - thickness / 2] as const;
    const screened = throughHole(screenHole(design), ...sides);
    const capacitance = design.screens === 'between' ? screened : unscreened;
    return {
      section,
      distance,
      face,
      unscreened,
      screened: Math.min(screened, unscreened),
      capacitance: Math.min(capacitance, unscreened),
      coefficient:
        Math.min(capacitance, unscreened) / Math.sqrt(before.totalMin * next.totalMin),
      shieldedMeshed:
        endsInRotor(derived, section, 'front') || endsInRotor(derived, section + 1, 'back'),
    };
  });
}
