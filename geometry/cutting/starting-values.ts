/**
 * Machines and sheets to begin with, until a workshop has entered its own. Common practice, no
 * source, but for the thickness tolerance.
 */

import type { Machine, Sheet } from './machine';

const common = {
  smallestHole: 1,
  smallestWeb: 1,
  reflective: true,
  bridges: 0,
  bridgeWidth: 0.5,
} as const;

export const startingMachines: readonly Machine[] = [
  {
    ...common,
    name: 'Fibre laser',
    process: 'laser',
    kerf: 0.15,
    bedWidth: 1500,
    bedHeight: 1000,
    leadIn: 1,
    feed: 50,
    pierceTime: 0.4,
  },
  {
    ...common,
    name: 'CO₂ laser',
    process: 'laser',
    kerf: 0.25,
    bedWidth: 1200,
    bedHeight: 800,
    reflective: false,
    leadIn: 1.5,
    feed: 30,
    pierceTime: 0.8,
  },
  {
    ...common,
    name: 'Waterjet, fine nozzle',
    process: 'waterjet',
    kerf: 0.5,
    bedWidth: 1000,
    bedHeight: 1000,
    leadIn: 2,
    bridges: 2,
    bridgeWidth: 0.8,
    feed: 5,
    pierceTime: 4,
  },
  {
    ...common,
    name: 'Photo-etching',
    process: 'etching',
    kerf: 0,
    smallestHole: 1.2,
    bedWidth: 600,
    bedHeight: 500,
    leadIn: 0,
    bridges: 2,
    bridgeWidth: 0.4,
    feed: 1,
    pierceTime: 0,
  },
  {
    ...common,
    name: 'Milling, 1 mm cutter',
    process: 'milling',
    kerf: 1,
    smallestWeb: 1.5,
    bedWidth: 600,
    bedHeight: 400,
    leadIn: 1.5,
    bridges: 3,
    bridgeWidth: 1.5,
    feed: 8,
    pierceTime: 3,
  },
];

/**
 * EN 485-4, aluminium alloys of group II, to which EN AW-5754 belongs, up to 1000 wide: thickness
 * up to, ± mm (published copies of BS EN 485-4:1994, as cited in the trade).
 */
const thicknessTolerances: readonly (readonly [upTo: number, tolerance: number])[] = [
  [0.5, 0.03],
  [0.8, 0.04],
  [1.2, 0.05],
  [1.5, 0.07],
  [1.8, 0.08],
  [2, 0.09],
  [2.5, 0.1],
  [3, 0.11],
  [3.5, 0.12],
  [4, 0.15],
];

/** For the other metals as a start: give what their own standard says. mm */
export function toleranceOf(thickness: number): number {
  return (thicknessTolerances.find(([upTo]) => thickness <= upTo) ?? [0, 0.2])[1];
}

/** Sheets of a size for each kind of stock that is needed. */
export function sheetsFor(
  needed: readonly Pick<Sheet, 'material' | 'thickness'>[],
  size: Pick<Sheet, 'width' | 'height' | 'count'>,
): Sheet[] {
  const kinds = new Map(needed.map((kind) => [`${kind.material} ${kind.thickness}`, kind]));
  return [...kinds.values()].map(({ material, thickness }) => ({
    material,
    thickness,
    thicknessTolerance: toleranceOf(thickness),
    ...size,
  }));
}
