/**
 * Loss in the metal of a meshed section by skin effect, and the unloaded Q it leads to. Current
 * crosses the gaps evenly over the meshed faces and gathers on both faces of a sheet: in rotor
 * plates towards the hub, in stator plates outwards, and from there to the posts. The sheet's
 * resistance is integrated along the radius, all plates side by side; spacers on the shaft and on
 * the posts carry what their length gathers (a third of their resistance). What it leaves out
 * makes the true Q lower: see {@link lossLeftOut}. Derived here; skin depth and the surface
 * resistance of a sheet are textbook.
 */

import { arrangementOf } from '../arrangement';
import type { Derived } from '../derived';
import type { Design } from '../design';
import { relativePermeability, resistivities, spacerMaterialOf, type Metal } from '../material';

/** Magnetic constant, H/mm (CODATA 2022: 1.25663706127e-6 H/m). */
const MU_0 = 1.25663706127e-9;

/**
 * δ = √(ρ/(π·f·µ0·µr)).
 * @param frequency Hz
 * @returns mm
 */
export function skinDepth(metal: Metal, frequency: number): number {
  const permeability = MU_0 * relativePermeability(metal);
  return Math.sqrt(resistivities[metal] / (Math.PI * frequency * permeability));
}

/**
 * Resistance of one face of a sheet that carries as much current on the other,
 * (ρ/δ)·(sinh x + sin x)/(cosh x − cos x) with x = t/δ: ρ/δ when thick, 2ρ/t when thin.
 * @param thickness mm @param frequency Hz
 * @returns Ω a square
 */
export function faceResistance(metal: Metal, thickness: number, frequency: number): number {
  const depth = skinDepth(metal, frequency);
  const x = thickness / depth;
  const share = x > 40 ? 1 : (Math.sinh(x) + Math.sin(x)) / (Math.cosh(x) - Math.cos(x));
  return (resistivities[metal] / depth) * share;
}

export const lossLeftOut: readonly string[] = [
  'the narrower way of the current while plates are only partly meshed',
  'contacts, wipers, bearings and leads beyond what is allowed for them',
  'insulators, film and disc',
  'joints, solder and roughness',
  'crowding at edges and between neighbouring plates',
  'radiation and what the field does outside the stack',
];

/** The metal at the surface: silver where the plates are plated. */
export function surfaceMetal({ finish, material }: Design): Metal {
  return finish === 'silver' ? 'silver' : material;
}

/** ∫ (I/I₀)² dr/(S·r) on both faces of a sector whose current gathers inwards, or outwards. */
function sectorPath(inner: number, outer: number, sector: number, inwards: boolean): number {
  const square = outer ** 2 - inner ** 2;
  const fourth = (outer ** 4 - inner ** 4) / 4;
  const ratio = Math.log(outer / inner);
  const integral = inwards
    ? ratio * outer ** 4 - outer ** 2 * square + fourth
    : ratio * inner ** 4 - inner ** 2 * square + fourth;
  return integral / square ** 2 / (2 * sector);
}

/** From the outside of a sector to its posts: half circles that close in on each of them. */
function pathToPosts({ statorSector, postCount, postSpacerRadius }: Design, outer: number) {
  const reach = (statorSector * outer) / postCount / 2;
  return Math.log(Math.max(1, reach / postSpacerRadius)) / (2 * Math.PI * postCount);
}

export interface Loss {
  /** mm */
  readonly skinDepth: number;
  /** Series resistance of plates, and of spacers on shaft and posts, Ω. */
  readonly plates: number;
  readonly rods: number;
  /** 1/(ω·C·R) at the capacitance asked for: of plates and spacers alone, the most it can be. */
  readonly q: number;
  /** The same with the contacts' resistance beside theirs. */
  readonly qWithContacts: number;
}

/**
 * @param frequency Hz
 * @param capacitance F, what the section has between its terminals there
 * @param contacts Ω, what wipers, joints and leads add between the terminals
 */
export function sectionLoss(
  { design, sections, stack }: Derived,
  index: number,
  frequency: number,
  capacitance: number,
  contacts = 0,
): Loss {
  const { sweepRadius } = sections[index]!;
  const section = design.sections[index]!;
  const { share, lobes } = arrangementOf(design);
  const { cutoutRadius, spacerRadius, postSpacerRadius, postCount } = design;
  const metal = surfaceMetal(design);
  // From the cut-out to the wall of spacers, all the current together.
  const neck =
    Math.log(cutoutRadius / Math.min(spacerRadius, 0.99 * cutoutRadius)) /
    ((2 * (2 * Math.PI)) / lobes);
  const inRotor = sectorPath(cutoutRadius, sweepRadius, design.rotorSector, true) + neck;
  const inStator =
    sectorPath(cutoutRadius, sweepRadius, design.statorSector, false) +
    pathToPosts(design, sweepRadius);
  const plates =
    (faceResistance(metal, section.rotorThickness, frequency) * inRotor) / section.rotorPlates +
    (faceResistance(metal, section.statorThickness, frequency) * inStator) /
      section.statorPlates;
  const sets = stack.plates.filter((plate) => plate.section === index && plate.pack === 0);
  const length = Math.max(...sets.map(({ z }) => z)) - Math.min(...sets.map(({ z }) => z));
  // Plates are plated, spacers aren't.
  const spacers = spacerMaterialOf(design);
  const rod = (radius: number): number =>
    ((resistivities[spacers] / skinDepth(spacers, frequency)) * length) /
    (2 * Math.PI * radius) /
    3;
  const rods = rod(spacerRadius) + rod(postSpacerRadius) / postCount;
  // Two in series have twice the resistance of one.
  const resistance = (plates + rods) / share;
  const reactance = 1 / (2 * Math.PI * frequency * capacitance);
  return {
    skinDepth: skinDepth(metal, frequency),
    plates: plates / share,
    rods: rods / share,
    q: reactance / resistance,
    qWithContacts: reactance / (resistance + contacts),
  };
}
