/**
 * A layout that comes from elsewhere, held against the parts it has to hold: nothing of it is
 * believed but where the parts lie. mm, rad.
 */

import type { KerfState } from '../cutting/cut-path';
import type { Machine, Sheet } from '../cutting/machine';
import { partFindings } from '../cutting/part-findings';
import { contourBounds } from '../measure';
import type { CutPart } from '../parts/part';
import { formatQuantity } from '../quantity';
import { clearanceOf } from './clearance';
import type { LaidGroup } from './lay-out';
import type { LayoutSettings, Placement } from './layout';
import { placedContour } from './placed';
import { tallyOf } from './tally';

/** Parts of one material and thickness on their sheets. */
export interface GivenGroup {
  readonly material: Sheet['material'];
  readonly thickness: number;
  readonly sheets: readonly Pick<Sheet, 'width' | 'height'>[];
  readonly placements: readonly Placement[];
}

/** All that files of sheets are made from beside the plates themselves. */
export interface GivenLayout {
  readonly machine: Machine;
  /** How many capacitors. */
  readonly copies: number;
  readonly settings: LayoutSettings;
  readonly kerf: KerfState;
  readonly groups: readonly GivenGroup[];
}

/** Why a layout can't be cut, with what would work. */
export class LayoutError extends Error {
  override readonly name = 'LayoutError';
}

/** mm. Sheets this near in thickness are the same. */
const SAME_THICKNESS = 1e-6;

/** mm and rad. A distance or bearing met to this is met. */
const ROUNDING = 1e-6;

const mm = (value: number): string => formatQuantity(value, 'length', 4);

function refuse(message: string): never {
  throw new LayoutError(message);
}

const wordsFor = ({ material, thickness }: Pick<CutPart, 'material' | 'thickness'>): string =>
  `${mm(thickness)} ${material}`;

/** Each part lies there as often as it is needed, and nothing else does. */
function checkCount(parts: readonly CutPart[], group: GivenGroup, copies: number): void {
  const lying = new Map<string, number>();
  for (const { key, sheet } of group.placements) {
    if (!parts.some((part) => part.key === key)) {
      refuse(
        `Layout: “${key}” is no part of ${wordsFor(group)} of this design; lay it out anew.`,
      );
    }
    if (!group.sheets[sheet]) {
      refuse(
        `Layout: a part lies on sheet ${sheet + 1} of ${wordsFor(group)}, which has ${group.sheets.length}; lay it out anew.`,
      );
    }
    lying.set(key, (lying.get(key) ?? 0) + 1);
  }
  for (const { key, label, quantity } of parts) {
    const has = lying.get(key) ?? 0;
    const needs = quantity * copies;
    if (has !== needs) {
      refuse(
        `Layout: ${label.toLowerCase()} lies there ${has} times, and ${needs} are needed; ${has < needs ? 'add sheets or take larger ones' : 'lay it out anew'}.`,
      );
    }
  }
}

function checkTurns(
  parts: readonly CutPart[],
  { placements }: GivenGroup,
  rotations: number,
): void {
  const step = (2 * Math.PI) / rotations;
  for (const { key, angle } of placements) {
    const part = parts.find((one) => one.key === key)!;
    const off = Math.abs(angle / step - Math.round(angle / step)) * step;
    if (part.outside.kind === 'path' && off > ROUNDING) {
      refuse(
        `Layout: ${part.label.toLowerCase()} is turned by ${formatQuantity(angle, 'angle', 4)}, and only steps of ${formatQuantity(step, 'angle', 4)} are asked for; lay it out anew.`,
      );
    }
  }
}

function checkBed(group: GivenGroup, { name, bedWidth, bedHeight }: Machine): void {
  for (const { width, height } of group.sheets) {
    const within =
      (width <= bedWidth && height <= bedHeight) || (width <= bedHeight && height <= bedWidth);
    if (!within) {
      refuse(
        `Layout: a sheet of ${wordsFor(group)} is ${mm(width)} by ${mm(height)}, and the bed of ${name} is ${mm(bedWidth)} by ${mm(bedHeight)}; take smaller sheets.`,
      );
    }
  }
}

/** What of the machine spoils parts whatever is asked of it. */
function checkKerf(
  parts: readonly CutPart[],
  { machine, settings: { gap }, kerf }: GivenLayout,
): void {
  if (gap < machine.kerf) {
    refuse(
      `Gap: ${mm(gap)} is less than the kerf of ${mm(machine.kerf)}, so that two cuts would meet; give at least ${mm(machine.kerf)}.`,
    );
  }
  if (kerf === 'nominal') return;
  for (const part of parts) {
    const closes = partFindings(part, machine).find(({ code }) => code === 'kerf-closes');
    if (closes) refuse(`Kerf: ${closes.label}. ${closes.change}`);
  }
}

function heldGroup(
  parts: readonly CutPart[],
  group: GivenGroup,
  { machine, copies, settings, kerf }: GivenLayout,
): LaidGroup {
  checkCount(parts, group, copies);
  checkTurns(parts, group, settings.rotations);
  checkBed(group, machine);
  const outlines = new Map(parts.map(({ key, outside }) => [key, outside]));
  const sheets = group.sheets.map(({ width, height }, index) => {
    const edge = group.placements
      .filter(({ sheet }) => sheet === index)
      .reduce(
        (most, at) =>
          Math.max(most, contourBounds(placedContour(outlines.get(at.key)!, at)).maxX),
        0,
      );
    if (edge === 0) {
      refuse(
        `Layout: nothing lies on sheet ${index + 1} of ${wordsFor(group)}; lay it out anew.`,
      );
    }
    return { stock: 0, width, height, used: Math.min(width, edge + settings.margin) };
  });
  const clearance = clearanceOf(outlines, group.placements, sheets);
  const { nearest, nearestEdge } = clearance;
  if (nearest !== null && nearest < settings.gap - ROUNDING) {
    refuse(
      nearest === 0
        ? `Layout: parts of ${wordsFor(group)} overlap; lay it out anew.`
        : `Layout: parts of ${wordsFor(group)} come as near as ${mm(nearest)}, and the gap is to be ${mm(settings.gap)}; lay it out anew.`,
    );
  }
  if (nearestEdge !== null && nearestEdge < settings.margin - ROUNDING) {
    refuse(
      nearestEdge < 0
        ? `Layout: a part of ${wordsFor(group)} reaches over the edge of its sheet; lay it out anew.`
        : `Layout: a part of ${wordsFor(group)} is ${mm(nearestEdge)} from the edge of its sheet, and the margin is to be ${mm(settings.margin)}; lay it out anew.`,
    );
  }
  const { material, thickness } = parts[0]!;
  const layout = { placements: group.placements, sheets, left: [], ...clearance };
  return { material, thickness, parts, layout, tally: tallyOf(layout, parts, machine, kerf) };
}

/**
 * The groups of a layout with the design's own parts in them.
 * @throws LayoutError for anything missing, too many, too near or too large
 */
export function heldLayout(parts: readonly CutPart[], given: GivenLayout): LaidGroup[] {
  checkKerf(parts, given);
  const left = new Set(parts);
  const groups = given.groups.map((group) => {
    const own = [...left].filter(
      ({ material, thickness }) =>
        material === group.material && Math.abs(thickness - group.thickness) < SAME_THICKNESS,
    );
    if (own.length === 0) {
      refuse(`Layout: ${wordsFor(group)} is not of this design; lay it out anew.`);
    }
    for (const part of own) left.delete(part);
    return heldGroup(own, group, given);
  });
  const [missing] = left;
  if (missing) {
    refuse(
      `Layout: ${missing.label.toLowerCase()} of ${wordsFor(missing)} is on no sheet; lay out all parts, and add such sheet if there is none.`,
    );
  }
  return groups;
}
