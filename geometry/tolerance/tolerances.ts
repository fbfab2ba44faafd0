/** What may differ from the drawing, by how much. */

import type { Spread } from './random';

export type ToleranceName =
  'thickness' | 'spacer' | 'centring' | 'tilt' | 'outline' | 'cutout' | 'angle';

export interface Tolerance {
  readonly label: string;
  readonly help: string;
  /** ± in mm, for `angle` in rad. */
  readonly amount: number;
  readonly spread: Spread;
}

export type Tolerances = Readonly<Record<ToleranceName, Tolerance>>;

const DEGREE = Math.PI / 180;

/** To start from; each says where it comes from. */
export const startingTolerances: Tolerances = {
  thickness: {
    label: 'Sheet thickness',
    help: 'Each plate. ± 0.03 to 0.05 for sheet of 0.5 to 1.2 mm (EN 485-4, aluminium alloys of group II); other metals as their standard says.',
    amount: 0.04,
    spread: 'even',
  },
  spacer: {
    label: 'Spacer length',
    help: 'Each spacer, turned. Common practice, no source.',
    amount: 0.01,
    spread: 'normal',
  },
  centring: {
    label: 'Rotor between stators',
    help: 'The whole rotor along the shaft, as it was set. Common practice, no source.',
    amount: 0.05,
    spread: 'even',
  },
  tilt: {
    label: 'Rotor out of true',
    help: 'At the rim, over the whole rotor. Common practice, no source.',
    amount: 0.05,
    spread: 'normal',
  },
  outline: {
    label: 'Outer edge of the rotor',
    help: 'All plates alike, as the cut lies. ± 0.10 for 10 to 35 mm in thin sheet (ISO 9013, class 1).',
    amount: 0.1,
    spread: 'normal',
  },
  cutout: {
    label: 'Cut-out of the stator',
    help: 'All plates alike. ± 0.10 for 3 to 10 mm in thin sheet (ISO 9013, class 1).',
    amount: 0.1,
    spread: 'normal',
  },
  angle: {
    label: 'Plates on the shaft',
    help: 'Each rotor plate round the shaft. Common practice, no source.',
    amount: 0.3 * DEGREE,
    spread: 'normal',
  },
};

export const toleranceNames = Object.keys(startingTolerances) as ToleranceName[];
