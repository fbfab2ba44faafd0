/**
 * Loss in the metal of a meshed section by skin effect, and the unloaded Q it leads to. Current
 * fills plates evenly over their meshed faces and gathers towards the hub, and towards the posts,
 * as the area behind each radius: the sheet's resistance on both faces, integrated along the
 * radius, all plates side by side; shaft and posts carry what their length gathers (a third of
 * their resistance). What it leaves out makes the true Q lower: see {@link lossLeftOut}.
 * Derived here from the surface resistance ρ/δ; skin depth: textbook.
 */

import { arrangementOf } from '../arrangement';
import type { Derived } from '../derived';
import type { Design } from '../design';
import { resistivities, type Metal } from '../material';

/** Magnetic constant, H/mm (CODATA 2022: 1.25663706127e-6 H/m). */
const MU_0 = 1.25663706127e-9;

/**
 * δ = √(ρ/(π·f·µ0)).
 * @param resistivity Ω·mm @param frequency Hz
 * @returns mm
 */
export function skinDepth(resistivity: number, frequency: number): number {
  return Math.sqrt(resistivity / (Math.PI * frequency * MU_0));
}

export const lossLeftOut: readonly string[] = [
  'contacts, wipers and bearings that carry the rotor’s current',
  'insulators, film and disc',
  'joints, solder and roughness',
  'crowding at edges and between neighbouring plates',
  'radiation and what the field does outside the stack',
];

/** The metal at the surface: silver where the plates are plated. */
export function surfaceMetal({ finish, material }: Design): Metal {
  return finish === 'silver' ? 'silver' : material;
}

/** ∫ (I/I₀)² dr/(S·r) on both faces of a sector that gathers its current towards a radius. */
function sectorPath(inner: number, outer: number, sector: number): number {
  const square = outer ** 2 - inner ** 2;
  const integral =
    Math.log(outer / inner) * outer ** 4 - outer ** 2 * square + (outer ** 4 - inner ** 4) / 4;
  return integral / square ** 2 / (2 * sector);
}

export interface Loss {
  /** mm */
  readonly skinDepth: number;
  /** Series resistance of plates, and of shaft with posts, Ω. */
  readonly plates: number;
  readonly rods: number;
  /** 1/(ω·C·R) at the capacitance asked for. */
  readonly q: number;
}

/**
 * @param frequency Hz
 * @param capacitance F, what the section has between its terminals there
 */
export function sectionLoss(
  { design, sections, stack }: Derived,
  index: number,
  frequency: number,
  capacitance: number,
): Loss {
  const section = sections[index]!;
  const { rotorPlates, statorPlates } = design.sections[index]!;
  const { share, lobes } = arrangementOf(design);
  const resistivity = resistivities[surfaceMetal(design)];
  const depth = skinDepth(resistivity, frequency);
  const surface = resistivity / depth;
  const { cutoutRadius, spacerRadius, postSpacerRadius, postCount } = design;
  const path = sectorPath(cutoutRadius, section.sweepRadius, design.rotorSector);
  // From the cut-out to the wall of spacers, all the current together.
  const neck =
    Math.log(cutoutRadius / Math.min(spacerRadius, 0.99 * cutoutRadius)) /
    ((2 * (2 * Math.PI)) / lobes);
  const plates = surface * ((path + neck) / rotorPlates + path / statorPlates);
  const sets = stack.plates.filter((plate) => plate.section === index && plate.pack === 0);
  const length = Math.max(...sets.map(({ z }) => z)) - Math.min(...sets.map(({ z }) => z));
  const rod = (radius: number): number => (surface * length) / (2 * Math.PI * radius) / 3;
  const rods = rod(spacerRadius) + rod(postSpacerRadius) / postCount;
  // Two in series have twice the resistance of one.
  const resistance = (plates + rods) / share;
  return {
    skinDepth: depth,
    plates: plates / share,
    rods: rods / share,
    q: 1 / (2 * Math.PI * frequency * capacitance * resistance),
  };
}
