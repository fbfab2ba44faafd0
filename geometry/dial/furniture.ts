/** What both kinds of dial carry: sizes of marks, check bar, pointer. mm */

import { box, line, ring, text, type Mark } from '../sketch/sketch';
import type { DialQuantity } from './quantity';
import type { DialSettings } from './settings';

/** Nearest that two marks may stand: what an eye at arm's length tells apart. */
export const APART = 1.4;
/** Height of numbers, and room kept free about them. */
export const NUMBER = 2.5;
export const ROOM = 0.8;
export const LENGTHS = { long: 6, middle: 4, short: 2.5 } as const;
export const WIDTHS = { long: 0.35, middle: 0.25, short: 0.18 } as const;
export const THIN = 0.13;
/** Of the stops, which are no value. */
export const DASH = [0.8, 0.6] as const;

export const quantityLabels: Readonly<Record<DialQuantity, string>> = {
  frequency: 'Frequency',
  wavelength: 'Wavelength',
  capacitance: 'Capacitance',
};

const CHECK = 50;
/** Of all that stands beside the check bar. */
export const CHECK_WIDTH = CHECK + 55;

/** A bar by which one sees whether the printer kept the size. */
export function checkBar(x: number, y: number, stops: boolean): Mark[] {
  const end = (at: number): Mark => line(at, y - 1.5, at, y + 1.5, 0.25);
  return [
    line(x, y, x + CHECK, y, 0.25),
    end(x),
    end(x + CHECK),
    text(x + CHECK + 2, y + 0.9, `${CHECK} mm when printed at full size`, 1.8),
    ...(stops ? [text(x, y + 4.5, 'Dashed: where the shaft meets its stops', 1.8)] : []),
  ];
}

/** Width of the strip that carries a pointer's line. */
const STRIP = 12;
export const STRIP_ROOM = STRIP + 6;

/** +1 where values follow one another clockwise, or to the right, while the plates mesh. */
export function directionOf({ moves, sense }: Pick<DialSettings, 'moves' | 'sense'>): 1 | -1 {
  return (sense === 'clockwise') === (moves === 'pointer') ? 1 : -1;
}

/** A strip to cut out: the pointer that turns about its hole, or a line that stays. */
export function pointerStrip(
  { moves, form, radius, hole }: DialSettings,
  x: number,
  y: number,
): Mark[] {
  const middle = y + STRIP / 2;
  if (form === 'straight' || moves === 'scale') {
    const words = moves === 'scale' ? 'Fixed line, to cut out' : 'Pointer, to cut out';
    return [
      box(x, y, 2.5 * STRIP, STRIP, THIN),
      line(x, middle, x + 2.5 * STRIP, middle, WIDTHS.middle),
      text(x + 2.5 * STRIP + 2, middle + 0.9, words, 1.8),
    ];
  }
  const axis = x + Math.max(hole / 2 + 3, STRIP / 2);
  const half = Math.max(STRIP, hole + 6) / 2;
  return [
    box(x, middle - half, axis - x + radius, 2 * half, THIN),
    line(axis, middle, axis + radius, middle, WIDTHS.middle),
    ring(axis, middle, Math.max(hole, 1) / 2, THIN),
    text(axis + radius + 2, middle + 0.9, 'Pointer, to cut out', 1.8),
  ];
}
