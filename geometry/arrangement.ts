/** How rotor and stators stand to each other, and between which of them the capacitance lies. */

import type { Design, Section } from './design';

export interface Arrangement {
  /** Blades on each rotor plate, evenly round the shaft. */
  readonly lobes: 1 | 2;
  /** Where the stators stand in plan, rad from the first. */
  readonly stators: readonly number[];
  /** Sets of plates along the shaft in one section. */
  readonly packs: 1 | 2;
  /**
   * Capacitance between the terminals over that of one blade with its stator: two equal ones in
   * series have half.
   */
  readonly share: 1 | 0.5;
  /** Does the rotor pass from one stator into the other? */
  readonly passesOn: boolean;
  /** Between what the capacitance is counted. */
  readonly terminals: string;
}

const arrangements: Record<Design['arrangement'], Arrangement> = {
  single: {
    lobes: 1,
    stators: [0],
    packs: 1,
    share: 1,
    passesOn: false,
    terminals: 'rotor to stator',
  },
  differential: {
    lobes: 1,
    stators: [0, Math.PI],
    packs: 1,
    share: 1,
    passesOn: true,
    terminals: 'rotor to the first stator',
  },
  'split-stator': {
    lobes: 1,
    stators: [0],
    packs: 2,
    share: 0.5,
    passesOn: false,
    terminals: 'stator to stator, rotor free',
  },
  butterfly: {
    lobes: 2,
    stators: [0, Math.PI],
    packs: 1,
    share: 0.5,
    passesOn: false,
    terminals: 'stator to stator, rotor free',
  },
};

export function arrangementOf({ arrangement }: Pick<Design, 'arrangement'>): Arrangement {
  return arrangements[arrangement];
}

/** Gaps of one blade with its stator. */
export function gapsOf({ rotorPlates, statorPlates }: Section): number {
  return rotorPlates + statorPlates - 1;
}

/** Angles at which a blade passes a point of a stator, rad apart: its own and its twins'. */
export function passesOf({ lobes, stators }: Arrangement): readonly number[] {
  return lobes === 2 || stators.length === 2 ? [0, Math.PI] : [0];
}
