/**
 * Temperature coefficient of the plates' capacitance. Area grows with the plates' metal, twice its
 * expansion; each pair of gaps is what the spacer leaves beside the plate between its ends:
 * 2α − (S·αs − t·α)/(S − t), S the spacer and t that plate (derived; common to handbooks of the
 * trade). Air: (ε − 1) goes with its density.
 */

import { expansions, spacerMaterialOf } from '../material';
import type { Design, Section } from '../design';

export interface Drift {
  /** 1/K: area, gap, and the air between; and their sum. */
  readonly area: number;
  readonly gap: number;
  readonly air: number;
  readonly total: number;
}

/** 1/K about 20 °C in dry air: from 1.000575797 at 0 °C to 1.000536509 at 20 °C (ITU-R P.453). */
const AIR = (1.000536509 / 1.000575797 - 1) / 20;

export const driftLeftOut: readonly string[] = [
  'film, disc, insulators and frame, whose capacitance drifts by its own law',
  'plates that bow or creep as they warm',
  'end play of the shaft',
];

export function sectionDrift(design: Design, section: Section): Drift {
  const { airGap, rotorThickness, statorThickness, dielectric } = section;
  const plate = expansions[design.material];
  const spacer = expansions[spacerMaterialOf(design)];
  // Stator spacers hold the gaps beside a rotor plate, rotor spacers those beside a stator plate.
  const between = (thickness: number): number => {
    const length = 2 * airGap + thickness;
    return -(length * spacer - thickness * plate) / (2 * airGap);
  };
  const area = 2 * plate;
  const gap = (between(rotorThickness) + between(statorThickness)) / 2;
  const air = dielectric === 'disc' ? 0 : AIR;
  return { area, gap, air, total: area + gap + air };
}
