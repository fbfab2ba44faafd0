/** What a machine makes of a part: holes, webs, kerf, bed and material. */

import type { Contour } from '../outline';
import type { CutPart } from '../parts/part';
import { formatQuantity } from '../quantity';
import { contoursApart, held, type Held } from './apart';
import { selfCrossing } from './crossing';
import type { CuttingFinding } from './cutting-finding';
import type { Machine } from './machine';
import { isBright } from './material-caution';
import { narrowest } from './narrow';
import { offsetContour } from './offset';
import { sidesOf } from './side';

const mm = (value: number): string => formatQuantity(value, 'length', 4);

/** mm. A limit met to this is met. */
const ROUNDING = 1e-9;

interface Measured {
  readonly what: string;
  readonly value: number;
}

const least = (all: readonly Measured[]): Measured | null =>
  all.reduce<Measured | null>((a, b) => (a && a.value <= b.value ? a : b), null);

/** Narrowest of a hole: its diameter, or straight across. */
function holeWidth(hole: Contour): number {
  if (hole.kind === 'circle') return 2 * hole.radius;
  return narrowest(sidesOf(hole), -1)?.width ?? Infinity;
}

/** The narrowest hole or slot of a part. */
export function narrowestOpening({
  outside,
  holes,
}: Pick<CutPart, 'outside' | 'holes'>): Measured | null {
  const slot = outside.kind === 'path' ? narrowest(sidesOf(outside), 1) : null;
  return least([
    ...holes.map((hole) => ({ what: 'Smallest hole', value: holeWidth(hole) })),
    ...(slot ? [{ what: 'Narrowest slot', value: slot.width }] : []),
  ]);
}

/** The narrowest metal of a part: between holes, from a hole to the edge, between edges. */
export function narrowestWeb({
  outside,
  holes,
}: Pick<CutPart, 'outside' | 'holes'>): Measured | null {
  const edge = sidesOf(outside).map(held);
  const inner = holes.map((hole): Held[] => sidesOf(hole).map(held));
  const own = outside.kind === 'path' ? narrowest(sidesOf(outside), -1) : null;
  const tongues = holes.flatMap((hole) => {
    const tongue = hole.kind === 'path' ? narrowest(sidesOf(hole), 1) : null;
    return tongue ? [{ what: 'Narrowest tongue in a hole', value: tongue.width }] : [];
  });
  return least([
    ...(own ? [{ what: 'Narrowest web between edges', value: own.width }] : []),
    ...inner.map((hole) => ({
      what: 'Web from hole to edge',
      value: contoursApart(hole, edge),
    })),
    ...inner.flatMap((hole, i) =>
      inner.slice(i + 1).map((other) => ({
        what: 'Web between holes',
        value: contoursApart(hole, other),
      })),
    ),
    ...tongues,
  ]);
}

function atLeast(
  code: 'hole-small' | 'web-thin',
  part: CutPart,
  measured: Measured | null,
  limit: number,
  change: string,
): CuttingFinding[] {
  if (!measured || measured.value === Infinity) return [];
  const holds = measured.value >= limit - ROUNDING;
  return [
    {
      code,
      severity: holds ? 'ok' : 'fail',
      part: part.key,
      label: `${measured.what}, ${part.label.toLowerCase()}`,
      value: measured.value,
      limit,
      quantity: 'length',
      change: holds ? '' : change,
    },
  ];
}

/** Contours that cross themselves. */
function crossingFindings(part: CutPart): CuttingFinding[] {
  const at = [part.outside, ...part.holes]
    .map((contour) => selfCrossing(sidesOf(contour)))
    .find((point) => point !== null);
  if (!at) return [];
  return [
    {
      code: 'contour-crosses',
      severity: 'fail',
      part: part.key,
      label: `Outline crosses itself, ${part.label.toLowerCase()}`,
      value: null,
      limit: null,
      quantity: 'length',
      change: `Near ${mm(at.x)}, ${mm(at.y)} from the shaft it runs over itself: slots, ears or edges overlap there. Make them fewer, narrower or further apart.`,
    },
  ];
}

/** Contours in which a cut of this width has no room. */
function kerfFindings(part: CutPart, { kerf }: Machine): CuttingFinding[] {
  const closings = [
    offsetContour(part.outside, kerf / 2).closing,
    ...part.holes.map((hole) => offsetContour(hole, -kerf / 2).closing),
  ].flatMap((closing) => (closing ? [closing] : []));
  const worst = least(closings.map(({ width }) => ({ what: '', value: width })));
  if (!worst) return [];
  return [
    {
      code: 'kerf-closes',
      severity: 'fail',
      part: part.key,
      label: `Narrow place against the kerf, ${part.label.toLowerCase()}`,
      value: worst.value,
      limit: kerf,
      quantity: 'length',
      change: `A cut ${mm(kerf)} wide closes it up: make it wider than ${mm(kerf)}, or take a machine with a kerf under ${mm(worst.value)}.`,
    },
  ];
}

function materialFindings(part: CutPart, machine: Machine): CuttingFinding[] {
  if (machine.process !== 'laser') return [];
  const without = { part: part.key, value: null, limit: null, quantity: 'count' } as const;
  if (part.material === 'insulator') {
    return [
      {
        ...without,
        code: 'fumes',
        severity: 'warn',
        label: `Insulator under a laser, ${part.label.toLowerCase()}`,
        change:
          'PVC gives off chlorine and hydrogen chloride, PTFE hydrogen fluoride: never laser-cut either. Glass-filled sheet chars: waterjet or mill it.',
      },
    ];
  }
  if (machine.reflective || !isBright(part.material)) return [];
  return [
    {
      ...without,
      code: 'reflective',
      severity: 'fail',
      label: `Bright ${part.material} under a laser, ${part.label.toLowerCase()}`,
      change: `It throws the beam back: take a laser rated for bright ${part.material}, or cut it by waterjet, etching or milling; or make the plates of steel.`,
    },
  ];
}

/** All checks of one part on a machine, those that pass too. */
export function partFindings(part: CutPart, machine: Machine): CuttingFinding[] {
  const smallest = machine.smallestHole * part.thickness;
  const thinnest = machine.smallestWeb * part.thickness;
  return [
    ...atLeast(
      'hole-small',
      part,
      narrowestOpening(part),
      smallest,
      `In ${mm(part.thickness)} sheet this machine cuts no hole or slot under ${mm(smallest)}: make it at least that, drill it, or take thinner sheet.`,
    ),
    ...atLeast(
      'web-thin',
      part,
      narrowestWeb(part),
      thinnest,
      `In ${mm(part.thickness)} sheet this machine leaves no web under ${mm(thinnest)} standing: make it at least that, or take thinner sheet.`,
    ),
    ...crossingFindings(part),
    ...kerfFindings(part, machine),
    ...materialFindings(part, machine),
  ];
}
