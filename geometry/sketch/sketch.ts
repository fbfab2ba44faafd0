/**
 * Lines and lettering on paper, mm, x to the right and y downwards from the sheet's upper left
 * corner. Dial and drawing are made of it; SVG and PDF are written from it.
 */

import { walk, type Contour } from '../outline';

export interface Stroke {
  readonly kind: 'stroke';
  /** SVG path data in mm. */
  readonly path: string;
  readonly width: number;
  readonly dash?: readonly number[];
}

export interface Lettering {
  readonly kind: 'text';
  readonly x: number;
  /** Of the baseline. */
  readonly y: number;
  readonly text: string;
  /** Height of capitals, mm (ISO 3098). */
  readonly height: number;
  readonly anchor: 'start' | 'middle' | 'end';
  readonly bold?: boolean;
  /** Clockwise on the paper, degrees. */
  readonly turn?: number;
}

export interface Filling {
  readonly kind: 'fill';
  readonly path: string;
}

export type Mark = Stroke | Lettering | Filling;

export interface Sketch {
  readonly width: number;
  readonly height: number;
  readonly marks: readonly Mark[];
}

const n = (value: number): string => String(Number(value.toFixed(4)) + 0);

export function line(
  x1: number,
  y1: number,
  x2: number,
  y2: number,
  width: number,
  dash?: readonly number[],
): Stroke {
  const path = `M${n(x1)} ${n(y1)}L${n(x2)} ${n(y2)}`;
  return { kind: 'stroke', path, width, ...(dash && { dash }) };
}

export function box(x: number, y: number, w: number, h: number, width: number): Stroke {
  return { kind: 'stroke', path: `M${n(x)} ${n(y)}h${n(w)}v${n(h)}h${n(-w)}z`, width };
}

export function ring(x: number, y: number, radius: number, width: number): Stroke {
  return { kind: 'stroke', path: circlePath(x, y, radius), width };
}

function circlePath(x: number, y: number, radius: number): string {
  const r = n(radius);
  return `M${n(x - radius)} ${n(y)}a${r} ${r} 0 1 0 ${n(2 * radius)} 0a${r} ${r} 0 1 0 ${n(-2 * radius)} 0z`;
}

/** An arc about a centre from one bearing to another; bearings in rad, y downwards. */
export function arc(
  x: number,
  y: number,
  radius: number,
  from: number,
  to: number,
  width: number,
): Stroke {
  const at = (angle: number): string =>
    `${n(x + radius * Math.cos(angle))} ${n(y + radius * Math.sin(angle))}`;
  const large = Math.abs(to - from) > Math.PI ? 1 : 0;
  const sweep = to > from ? 1 : 0;
  return {
    kind: 'stroke',
    path: `M${at(from)}A${n(radius)} ${n(radius)} 0 ${large} ${sweep} ${at(to)}`,
    width,
  };
}

/** A contour of the kernel (y upwards) at a scale, its origin at a point of the paper. */
export function outline(
  contour: Contour,
  { x, y, scale }: { readonly x: number; readonly y: number; readonly scale: number },
  width: number,
): Stroke {
  let path = '';
  const at = (px: number, py: number): string => `${n(x + px * scale)} ${n(y - py * scale)}`;
  walk(contour, {
    move: (px, py) => {
      path += `M${at(px, py)}`;
    },
    line: (px, py) => {
      path += `L${at(px, py)}`;
    },
    arc: (px, py, _centre, radius, _start, sweep) => {
      const r = n(radius * scale);
      path += `A${r} ${r} 0 ${Math.abs(sweep) > Math.PI ? 1 : 0} ${sweep > 0 ? 0 : 1} ${at(px, py)}`;
    },
    circle: (cx, cy, radius) => {
      path += circlePath(x + cx * scale, y - cy * scale, radius * scale);
    },
    close: () => {
      path += 'z';
    },
  });
  return { kind: 'stroke', path, width };
}

export function text(
  x: number,
  y: number,
  written: string,
  height: number,
  rest: Partial<Pick<Lettering, 'anchor' | 'bold' | 'turn'>> = {},
): Lettering {
  return { kind: 'text', x, y, text: written, height, anchor: 'start', ...rest };
}

/** Width of a text as it is lettered, about: an even face, so that nothing need be measured. */
export function widthOf(written: string, height: number): number {
  return written.length * height * LETTER_WIDTH;
}

/** Of the height of capitals, for the face in fonts/: on the wide side of its mean. */
const LETTER_WIDTH = 0.82;

/** Height of capitals over the size of the type, for the face in fonts/. */
export const CAPITALS = 0.686;
