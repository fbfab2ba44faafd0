/**
 * Paper, frame, zones and scales. ISO 5457: A4 210 × 297, A3 297 × 420, border 20 at the left and
 * 10 elsewhere, frame 0.7 wide, zones 50 long (published). ISO 3098: lettering 1.8, 2.5, 3.5 and 5
 * high. ISO 5455: scales (from memory).
 */

import { box, line, text, type Mark } from '../sketch/sketch';

export interface Paper {
  readonly name: 'A4' | 'A3';
  readonly width: number;
  readonly height: number;
}

export const A4: Paper = { name: 'A4', width: 210, height: 297 };
export const A3: Paper = { name: 'A3', width: 420, height: 297 };

export const LEFT = 20;
export const BORDER = 10;

/** Line widths of ISO 128, wide to narrow 2 : 1, mm. */
export const WIDE = 0.35;
export const NARROW = 0.18;

const FRAME = 0.7;
const ZONE = 50;

/** A zone cut off by the border to less than this has no room for its letter. */
const NARROW_ZONE = 8;

/** A rectangle on the paper, mm. */
export interface Area {
  readonly x: number;
  readonly y: number;
  readonly w: number;
  readonly h: number;
}

/** What lies inside the frame. */
export function drawingArea({ width, height }: Paper): Area {
  return { x: LEFT, y: BORDER, w: width - LEFT - BORDER, h: height - 2 * BORDER };
}

/** Letters without I and O, which are taken for numbers. */
const LETTERS = 'ABCDEFGHJKLMNPQRSTUVWXYZ';

/** Frame, centring marks and zones, counted from the upper left corner. */
export function frameMarks(paper: Paper): Mark[] {
  const { width, height } = paper;
  const { x, y, w, h } = drawingArea(paper);
  const marks: Mark[] = [box(x, y, w, h, FRAME)];
  const middle: [number, number, number, number][] = [
    [width / 2, 0, width / 2, y + 5],
    // Not into the title block.
    [width / 2, height, width / 2, y + h],
    [0, height / 2, x + 5, height / 2],
    [width, height / 2, x + w - 5, height / 2],
  ];
  for (const [x1, y1, x2, y2] of middle) marks.push(line(x1, y1, x2, y2, FRAME));
  // Zones run from the middle outwards; the last takes what is left.
  const divisions = (length: number, start: number): number[] => {
    const cuts: number[] = [];
    for (let at = (length / 2) % ZONE; at < length - 1; at += ZONE) if (at > 1) cuts.push(at);
    return [start, ...cuts.filter((cut) => cut > start + 1)];
  };
  const columns = divisions(width, x).concat(x + w);
  const rows = divisions(height, y).concat(y + h);
  columns.slice(0, -1).forEach((from, i) => {
    const to = columns[i + 1]!;
    if (i > 0)
      marks.push(
        line(from, y - 5, from, y, NARROW),
        line(from, y + h, from, y + h + 5, NARROW),
      );
    if (to - from < NARROW_ZONE) return;
    for (const at of [y - 1.2, y + h + 4.2]) {
      marks.push(text((from + to) / 2 + 3, at, String(i + 1), 2.5, { anchor: 'middle' }));
    }
  });
  rows.slice(0, -1).forEach((from, i) => {
    const to = rows[i + 1]!;
    if (i > 0)
      marks.push(
        line(x - 5, from, x, from, NARROW),
        line(x + w, from, x + w + 5, from, NARROW),
      );
    if (to - from < NARROW_ZONE) return;
    for (const at of [x - 3, x + w + 3]) {
      marks.push(text(at, (from + to) / 2 + 4, LETTERS[i]!, 2.5, { anchor: 'middle' }));
    }
  });
  return marks;
}

const SCALES = [10, 5, 2, 1, 1 / 2, 1 / 5, 1 / 10] as const;

/** The largest standard scale at which a thing of this size fits an area. */
export function scaleFor(
  size: { w: number; h: number },
  area: { w: number; h: number },
): number {
  return SCALES.find((scale) => size.w * scale <= area.w && size.h * scale <= area.h) ?? 1 / 20;
}

export const writtenScale = (scale: number): string =>
  scale >= 1 ? `${scale} : 1` : `1 : ${Math.round(1 / scale)}`;
