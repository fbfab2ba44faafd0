/** The plates of all sections along the shaft. */

import { arrangementOf, type Arrangement } from './arrangement';
import type { Design, Section } from './design';
import type { PlateRole, SectionResult, Stack, StackPlate, StackSpacer } from './derived';
import { contourReach } from './measure';

/** Spacer between neighbouring rotor plates: two gaps and the stator plate between them, mm. */
export function rotorSpacerLength(section: Section): number {
  return 2 * section.airGap + section.statorThickness;
}

/** Spacer between neighbouring stator plates, mm. */
export function statorSpacerLength(section: Section): number {
  return 2 * section.airGap + section.rotorThickness;
}

/** The outermost plates of a section, first and last. */
export function endPlatesOf({ rotorPlates, statorPlates }: Section): [PlateRole, PlateRole] {
  const first: PlateRole = statorPlates >= rotorPlates ? 'stator' : 'rotor';
  const last: PlateRole = rotorPlates >= statorPlates ? 'rotor' : 'stator';
  return [first, last];
}

/** Along the shaft between the last plate of a section and the first of the next, mm. */
export function roomBetween({
  sectionSpacing,
  screens,
  screenThickness,
}: Pick<Design, 'sectionSpacing' | 'screens' | 'screenThickness'>): number {
  return sectionSpacing + (screens === 'between' ? screenThickness : 0);
}

function packPlates(
  section: Section,
  { stators }: Arrangement,
  index: number,
  pack: number,
  start: number,
): StackPlate[] {
  const plates: StackPlate[] = [];
  let z = start;
  let [role] = endPlatesOf(section);
  for (let i = 0; i < section.rotorPlates + section.statorPlates; i++) {
    const thickness = role === 'rotor' ? section.rotorThickness : section.statorThickness;
    const place = { role, section: index, pack, z: z + thickness / 2, thickness };
    for (const angle of role === 'rotor' ? [0] : stators) plates.push({ ...place, angle });
    z += thickness + section.airGap;
    role = role === 'rotor' ? 'stator' : 'rotor';
  }
  return plates;
}

function spacersBetween(plates: readonly StackPlate[], role: PlateRole): StackSpacer[] {
  const own = plates.filter((plate) => plate.role === role && plate.angle === 0);
  return own.slice(1).map((plate, i) => {
    const from = own[i]!.z + own[i]!.thickness / 2;
    const to = plate.z - plate.thickness / 2;
    return {
      role,
      section: plate.section,
      pack: plate.pack,
      z: (from + to) / 2,
      length: to - from,
    };
  });
}

/** Stacks the sections from the first face on, each with its plates alternating. */
export function stackOf(design: Design, sections: readonly SectionResult[]): Stack {
  const plates: StackPlate[] = [];
  const spacers: StackSpacer[] = [];
  let start = 0;
  let depth = 0;
  const arrangement = arrangementOf(design);
  design.sections.forEach((section, index) => {
    for (let pack = 0; pack < arrangement.packs; pack++) {
      const own = packPlates(section, arrangement, index, pack, start);
      plates.push(...own);
      spacers.push(...spacersBetween(own, 'rotor'), ...spacersBetween(own, 'stator'));
      const last = own[own.length - 1]!;
      depth = last.z + last.thickness / 2;
      const within = pack < arrangement.packs - 1;
      start = depth + (within ? design.sectionSpacing : roomBetween(design));
    }
  });
  const allPlates = sections.flatMap(({ rotor, stator }) => [rotor, stator]);
  const sum = (of: 'mass' | 'cutLength'): number =>
    allPlates.reduce((total, plate) => total + plate[of] * plate.quantity, 0);
  return {
    plates,
    spacers,
    depth,
    sweepRadius: Math.max(...sections.map((section) => section.sweepRadius)),
    outerRadius: Math.max(...allPlates.map((plate) => contourReach(plate.outside))),
    mass: sum('mass'),
    cutLength: sum('cutLength'),
  };
}
