/** The sheet of one cut part: plan at a standard scale, sizes, polar table, notes. */

import type { Derived } from '../derived';
import { contourBounds } from '../measure';
import type { Contour } from '../outline';
import type { CutPart } from '../parts/part';
import { bladeOf } from '../rotor';
import { mirrorPath } from '../mirror';
import { BLADE_STEPS } from '../solve-blade';
import { line, outline, text, type Mark, type Sketch } from '../sketch/sketch';
import { across, leader, mm, upright } from './dimension';
import { A4, frameMarks, NARROW, scaleFor, WIDE, writtenScale } from './paper';
import { titleBlock, type Sheet } from './title-block';

/** Room for the plan view, mm on the paper. */
const VIEW = { x: 42, y: 24, w: 125, h: 112 } as const;

const CAUTIONS = [
  'Cut edges are sharp: break them, wear gloves.',
  'Bright copper, brass and aluminium throw a laser beam back: machine rated for it only.',
  'PVC gives chlorine, PTFE hydrogen fluoride when laser cut. Follow the machine’s manual and local codes.',
];

/** Holes of one size together: diameter and where the first stands. */
function holeGroups(
  holes: readonly Contour[],
): { diameter: number; count: number; x: number; y: number }[] {
  const groups: { diameter: number; count: number; x: number; y: number }[] = [];
  for (const hole of holes) {
    if (hole.kind !== 'circle') continue;
    const diameter = 2 * hole.radius;
    const known = groups.find((group) => Math.abs(group.diameter - diameter) < 1e-6);
    if (known) known.count += 1;
    else groups.push({ diameter, count: 1, x: hole.x, y: hole.y });
  }
  return groups;
}

/** Radius of a rotor's outer edge every 10° behind the leading edge. */
function polarTable(derived: Derived, part: CutPart, y: number): Mark[] {
  if (part.section === null || !/-rotor(-end)?$/.test(part.key)) return [];
  const { design, turn, sections } = derived;
  const { outside } = sections[part.section]!.rotor;
  if (outside.kind !== 'path') return [];
  const drawn = turn.direction > 0 ? outside : mirrorPath(outside);
  const blade = bladeOf(drawn, design.rotorSector, BLADE_STEPS);
  const degrees = (design.rotorSector * 180) / Math.PI;
  const at: number[] = [];
  for (let angle = 0; angle < degrees - 1; angle += 10) at.push(angle);
  at.push(degrees);
  const x = 25;
  const columns = 9;
  const [w, h] = [19, 4.2];
  const marks: Mark[] = [
    text(x, y, 'Outer edge, mm from the shaft, at degrees behind the leading edge', 2.5, {
      bold: true,
    }),
  ];
  at.forEach((angle, i) => {
    const cx = x + (i % columns) * w;
    const cy = y + 3 + Math.floor(i / columns) * (2 * h + 1.5);
    const position = (angle / degrees) * BLADE_STEPS;
    const k = Math.min(Math.floor(position), BLADE_STEPS - 1);
    const r = blade.radius[k]! + (position - k) * (blade.radius[k + 1]! - blade.radius[k]!);
    marks.push(
      line(cx, cy + h, cx + w, cy + h, NARROW),
      text(cx + w - 1, cy + h - 1, `${Number(angle.toFixed(1))}°`, 1.8, { anchor: 'end' }),
      text(cx + w - 1, cy + 2 * h - 1, r.toFixed(3), 1.8, { anchor: 'end' }),
    );
  });
  return marks;
}

export function partSheet(
  derived: Derived,
  part: CutPart,
  sheet: Omit<Sheet, 'scale' | 'title' | 'material'>,
  material: string,
): Sketch {
  const bounds = contourBounds(part.outside);
  const size = { w: bounds.maxX - bounds.minX, h: bounds.maxY - bounds.minY };
  const scale = scaleFor(size, VIEW);
  const x = VIEW.x + VIEW.w / 2 - ((bounds.minX + bounds.maxX) / 2) * scale;
  const y = VIEW.y + VIEW.h / 2 + ((bounds.minY + bounds.maxY) / 2) * scale;
  const place = { x, y, scale };
  const marks: Mark[] = [...frameMarks(A4)];
  marks.push(outline(part.outside, place, WIDE));
  for (const hole of part.holes) marks.push(outline(hole, place, WIDE));
  // Centre lines through the shaft.
  const [left, right] = [x + bounds.minX * scale, x + bounds.maxX * scale];
  const [top, bottom] = [y - bounds.maxY * scale, y - bounds.minY * scale];
  const dashed = [6, 1.5, 0.8, 1.5];
  marks.push(
    line(left - 4, y, right + 4, y, NARROW, dashed),
    line(x, top - 4, x, bottom + 4, NARROW, dashed),
  );
  marks.push(
    ...across(left, right, bottom, bottom + 9, size.w),
    ...upright(top, bottom, left, left - 9, size.h),
  );
  holeGroups(part.holes).forEach(({ diameter, count, x: hx, y: hy }, i) => {
    const [px, py] = [
      x + (hx + (diameter / 2) * Math.SQRT1_2) * scale,
      y - (hy + (diameter / 2) * Math.SQRT1_2) * scale,
    ];
    marks.push(
      ...leader(
        px,
        py,
        VIEW.x + VIEW.w + 2,
        VIEW.y + 4 + 7 * i,
        `${count > 1 ? `${count} × ` : ''}Ø ${mm(diameter)}`,
      ),
    );
  });
  let at = VIEW.y + VIEW.h + 20;
  const table = polarTable(derived, part, at);
  marks.push(...table);
  if (table.length > 0) at += 32;
  const notes = [
    `${part.quantity} off, ${mm(part.thickness)} thick. Contours nominal: no kerf added or taken off; the DXF rules.`,
    ...(part.note ? [part.note] : []),
    'Flat within 0.1 over the plate; free of burr; edges broken 0.1 to 0.2.',
    ...CAUTIONS,
  ];
  for (const note of notes) {
    for (const row of wrapped(note, 175, 2.2)) {
      marks.push(text(25, at, row, 2.2));
      at += 4.2;
    }
  }
  marks.push(
    ...titleBlock(A4, { ...sheet, title: part.label, material, scale: writtenScale(scale) }),
  );
  return { width: A4.width, height: A4.height, marks };
}

/** Breaks a note into rows of a width at a height of lettering. */
export function wrapped(note: string, width: number, height: number): string[] {
  const most = Math.floor(width / (height * 0.82));
  const rows: string[] = [];
  let row = '';
  for (const word of note.split(' ')) {
    if (row && row.length + 1 + word.length > most) {
      rows.push(row);
      row = word;
    } else row = row ? `${row} ${word}` : word;
  }
  return [...rows, row];
}
