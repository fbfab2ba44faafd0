/**
 * The title block, 180 wide at the lower right. ISO 7200: mandatory are legal owner, identification
 * number, date of issue, sheet number, title, approval person, creator and document type
 * (published). Projection symbol: ISO 5456-2 (from memory).
 */

import { box, line, ring, text, type Mark } from '../sketch/sketch';
import { BORDER, NARROW, WIDE, type Paper } from './paper';

export interface Sheet {
  readonly owner: string;
  readonly number: string;
  /** As written: 2026-12-01. */
  readonly issued: string;
  readonly sheet: string;
  readonly title: string;
  readonly approved: string;
  readonly creator: string;
  readonly documentType: string;
  readonly scale: string;
  readonly material: string;
  readonly finish: string;
  readonly tolerances: string;
  readonly revision: string;
  /** ISO 7200 calls it document status. */
  readonly status: string;
  readonly projection: 'first' | 'third';
}

export const BLOCK = { w: 180, h: 42 } as const;

export function blockCorner({ width, height }: Paper): { x: number; y: number } {
  return { x: width - BORDER - BLOCK.w, y: height - BORDER - BLOCK.h };
}

/** Frustum and circles: in first angle the circles stand to its right, in third to its left. */
function projectionSymbol(projection: Sheet['projection'], x: number, y: number): Mark[] {
  const [cone, circles] = projection === 'first' ? [x, x + 14] : [x + 9, x + 2];
  const dashed = [3, 1, 0.5, 1];
  return [
    line(cone, y - 1.5, cone, y + 1.5, WIDE),
    line(cone + 7, y - 3, cone + 7, y + 3, WIDE),
    line(cone, y - 1.5, cone + 7, y - 3, WIDE),
    line(cone, y + 1.5, cone + 7, y + 3, WIDE),
    ring(circles, y, 3, WIDE),
    ring(circles, y, 1.5, WIDE),
    line(cone - 2, y, cone + 9, y, NARROW, dashed),
    line(circles - 4, y, circles + 4, y, NARROW, dashed),
    line(circles, y - 4, circles, y + 4, NARROW, dashed),
  ];
}

/** The revision table, over the title block: what is on this sheet. */
export function revisionTable(
  paper: Paper,
  { revision, issued, creator, approved, status }: Sheet,
): Mark[] {
  const { x, y } = blockCorner(paper);
  const [w, h] = [BLOCK.w, 5];
  const top = y - 2 * h - 2;
  const columns: [number, string, string][] = [
    [0, 'Rev.', revision],
    [20, 'Date', issued],
    [45, 'Issued by', creator],
    [90, 'Approved by', approved],
    [135, 'Status', status],
  ];
  return [
    box(x, top, w, 2 * h, NARROW),
    line(x, top + h, x + w, top + h, NARROW),
    ...columns.flatMap(([at, label, value]) => [
      text(x + at + 1.5, top + h - 1.6, label, 1.8),
      text(x + at + 1.5, top + 2 * h - 1.6, value, 1.8),
    ]),
  ];
}

/** Cut to what a cell of a width takes at a height of lettering. */
export function fitted(written: string, width: number, height: number): string {
  const most = Math.max(3, Math.floor(width / (height * 0.82)));
  return written.length <= most ? written : `${written.slice(0, most - 1)}…`;
}

export function titleBlock(paper: Paper, sheet: Sheet): Mark[] {
  const { x, y } = blockCorner(paper);
  const marks: Mark[] = [box(x, y, BLOCK.w, BLOCK.h, WIDE)];
  const cell = (
    cx: number,
    cy: number,
    w: number,
    h: number,
    label: string,
    value: string,
    height = 2.5,
  ): void => {
    marks.push(box(x + cx, y + cy, w, h, NARROW));
    marks.push(text(x + cx + 1, y + cy + 2.6, label, 1.5));
    marks.push(
      text(x + cx + 1.5, y + cy + h - 1.8, fitted(value, w - 3, height), height, {
        bold: height > 2.5,
      }),
    );
  };
  cell(0, 0, 60, 10.5, 'Material', sheet.material);
  cell(60, 0, 45, 10.5, 'Finish', sheet.finish);
  cell(105, 0, 45, 10.5, 'Tolerances', sheet.tolerances);
  cell(150, 0, 30, 10.5, 'Scale', sheet.scale);
  cell(0, 10.5, 45, 10.5, 'Legal owner', sheet.owner);
  cell(45, 10.5, 30, 10.5, 'Created by', sheet.creator);
  cell(75, 10.5, 30, 10.5, 'Approved by', sheet.approved);
  cell(105, 10.5, 45, 10.5, 'Document type', sheet.documentType);
  cell(150, 10.5, 30, 10.5, 'Date of issue', sheet.issued);
  cell(0, 21, 105, 21, 'Title', sheet.title, 3.5);
  cell(105, 21, 45, 10.5, 'Identification number', sheet.number);
  cell(150, 21, 15, 10.5, 'Rev.', sheet.revision);
  cell(165, 21, 15, 10.5, 'Sheet', sheet.sheet);
  marks.push(box(x + 105, y + 31.5, 75, 10.5, NARROW));
  marks.push(...projectionSymbol(sheet.projection, x + 110, y + 36.75));
  marks.push(text(x + 135, y + 37.6, `mm, ${sheet.projection} angle`, 2.5));
  return marks;
}
