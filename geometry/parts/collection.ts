/** Collects parts as they are placed, so that quantities and places can't disagree. */

import { contourArea, contourLength } from '../measure';
import { sheetMaterials } from '../material';
import type { BoughtPart, CutPart, Part, TurnedPart } from './part';

/** Where one piece sits. mm along the shaft from the first face of the stack, and in plan. */
export interface Place {
  readonly x: number;
  readonly y: number;
  readonly from: number;
  readonly to: number;
  /** How far it is turned from the contour as drawn, rad. */
  readonly angle: number;
  /** Does it turn with the shaft? */
  readonly turns: boolean;
}

export interface Placed extends Place {
  readonly part: string;
}

export interface Collection {
  readonly parts: Part[];
  readonly placed: Placed[];
}

export const emptyCollection = (): Collection => ({ parts: [], placed: [] });

type Counted<P extends Part> = Omit<P, 'quantity' | 'kind' | 'mass' | 'area' | 'cutLength'>;

/** g/mm³. Glass-filled epoxy; handbook value, from memory. */
export const INSULATOR_DENSITY = 1.85e-3;

const densityOf = (material: CutPart['material']): number =>
  material === 'insulator' ? INSULATOR_DENSITY : sheetMaterials[material].density;

function place<P extends Part>(
  { parts, placed }: Collection,
  part: Omit<P, 'quantity'> & { readonly key: string },
  places: readonly Place[],
): void {
  if (places.length === 0) return;
  parts.push({ ...part, quantity: places.length } as unknown as Part);
  placed.push(...places.map((at) => ({ ...at, part: part.key })));
}

export function addCut(
  collection: Collection,
  part: Counted<CutPart>,
  places: readonly Place[],
): void {
  const holes = part.holes.reduce((sum, hole) => sum + contourArea(hole), 0);
  const area = contourArea(part.outside) - holes;
  const cutLength = [part.outside, ...part.holes].reduce((sum, c) => sum + contourLength(c), 0);
  const mass = area * part.thickness * densityOf(part.material);
  place<CutPart>(collection, { ...part, kind: 'cut', area, cutLength, mass }, places);
}

/** @param density g/mm³ */
export function addTurned(
  collection: Collection,
  part: Counted<TurnedPart>,
  density: number,
  places: readonly Place[],
): void {
  const section = (Math.PI / 4) * (part.outerDiameter ** 2 - part.boreDiameter ** 2);
  const mass = section * part.length * density;
  place<TurnedPart>(collection, { ...part, kind: 'turned', mass }, places);
}

/** Bought parts without a place of their own, screws and nuts, are counted apart. */
export function addBought(
  collection: Collection,
  part: Counted<BoughtPart>,
  places: readonly Place[] | number,
): void {
  if (typeof places !== 'number')
    place<BoughtPart>(collection, { ...part, kind: 'bought' }, places);
  else if (places > 0) collection.parts.push({ ...part, kind: 'bought', quantity: places });
}
