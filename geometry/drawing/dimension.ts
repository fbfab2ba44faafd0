/** Dimension lines with arrows and their numbers: ISO 129-1 (mm without unit, Ø before; from memory). */

import { line, text, type Mark } from '../sketch/sketch';
import { NARROW } from './paper';

const ARROW = 2.5;

function arrow(x: number, y: number, dx: number, dy: number): Mark {
  const [px, py] = [-dy * 0.3, dx * 0.3];
  const n = (value: number): string => value.toFixed(3);
  return {
    kind: 'fill',
    path: `M${n(x)} ${n(y)}L${n(x - ARROW * dx + px * ARROW * 0.6)} ${n(y - ARROW * dy + py * ARROW * 0.6)}L${n(x - ARROW * dx - px * ARROW * 0.6)} ${n(y - ARROW * dy - py * ARROW * 0.6)}z`,
  };
}

export const mm = (value: number): string => String(Number(value.toFixed(2)));

/** A length from left to right, its extension lines from `y` to the dimension line at `at`. */
export function across(x1: number, x2: number, y: number, at: number, value: number): Mark[] {
  const beyond = at > y ? 1.5 : -1.5;
  return [
    line(x1, y, x1, at + beyond, NARROW),
    line(x2, y, x2, at + beyond, NARROW),
    line(x1, at, x2, at, NARROW),
    arrow(x1, at, -1, 0),
    arrow(x2, at, 1, 0),
    text((x1 + x2) / 2, at - 1, mm(value), 2.5, { anchor: 'middle' }),
  ];
}

/** A length from above to below at the left, written to be read from the right. */
export function upright(y1: number, y2: number, x: number, at: number, value: number): Mark[] {
  const beyond = at > x ? 1.5 : -1.5;
  return [
    line(x, y1, at + beyond, y1, NARROW),
    line(x, y2, at + beyond, y2, NARROW),
    line(at, y1, at, y2, NARROW),
    arrow(at, y1, 0, -1),
    arrow(at, y2, 0, 1),
    text(at - 1, (y1 + y2) / 2, mm(value), 2.5, { anchor: 'middle', turn: -90 }),
  ];
}

/** A note with a line that ends at what it speaks of. */
export function leader(x: number, y: number, toX: number, toY: number, note: string): Mark[] {
  const right = toX >= x;
  const length = Math.hypot(toX - x, toY - y) || 1;
  return [
    arrow(x, y, (x - toX) / length, (y - toY) / length),
    line(x, y, toX, toY, NARROW),
    line(toX, toY, toX + (right ? 3 : -3), toY, NARROW),
    text(toX + (right ? 4 : -4), toY + 0.9, note, 2.5, { anchor: right ? 'start' : 'end' }),
  ];
}
