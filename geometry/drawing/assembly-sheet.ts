/** The assembly: plan and side view with balloons, list of parts, law chart. A3. */

import type { Derived } from '../derived';
import { contourBounds, contourReach } from '../measure';
import { assemblyOf } from '../parts/assembly';
import { billOf } from '../parts/bill';
import type { Placed } from '../parts/collection';
import type { Part } from '../parts/part';
import { planOf } from '../parts/solid';
import { box, line, outline, ring, text, type Mark, type Sketch } from '../sketch/sketch';
import { across } from './dimension';
import { A3, frameMarks, NARROW, scaleFor, WIDE, writtenScale } from './paper';
import { blockCorner, fitted, revisionTable, titleBlock, type Sheet } from './title-block';

const PLAN = { x: 27, y: 24, w: 118, h: 118 } as const;
const SIDE = { x: 150, y: 24, w: 84, h: 118 } as const;
const CHART = { x: 40, y: 180, w: 175, h: 85 } as const;
const LIST = { x: 240, y: 16, w: 165 } as const;

function planView(derived: Derived, scale: number): Mark[] {
  const { sections, design } = derived;
  const [x, y] = [PLAN.x + PLAN.w / 2, PLAN.y + PLAN.h / 2];
  const place = { x, y, scale };
  const marks: Mark[] = [];
  const { rotor, stator } = sections[0]!;
  marks.push(outline(stator.outside, place, WIDE), outline(rotor.outside, place, WIDE));
  for (const hole of [...stator.holes, ...rotor.holes])
    marks.push(outline(hole, place, NARROW));
  const reach = derived.stack.outerRadius * scale + 4;
  const dashed = [6, 1.5, 0.8, 1.5];
  marks.push(
    line(x - reach, y, x + reach, y, NARROW, dashed),
    line(x, y - reach, x, y + reach, NARROW, dashed),
  );
  marks.push(ring(x, y, (design.shaftDiameter / 2) * scale, NARROW));
  return marks;
}

/** Half the height of a part in the side view, about its own place, mm. */
function halfHeight(part: Part, derived: Derived): number {
  const plan = planOf(part, derived.design);
  if (!plan) return 0;
  if (plan.outside.kind === 'circle') return plan.outside.radius;
  return contourReach(plan.outside);
}

function sideView(
  derived: Derived,
  parts: readonly Part[],
  placed: readonly Placed[],
  scale: number,
  from: number,
): Mark[] {
  const y = SIDE.y + SIDE.h / 2;
  const at = (z: number): number => SIDE.x + (z - from) * scale;
  const marks: Mark[] = [];
  const balloons = new Map<number, { x: number; y: number }>();
  for (const place of placed) {
    const index = parts.findIndex(({ key }) => key === place.part);
    const part = parts[index]!;
    const plan = planOf(part, derived.design);
    if (!plan) continue;
    const b = contourBounds(plan.outside);
    const flat = place.x === 0 && place.y === 0 && plan.outside.kind === 'path';
    const [low, high] = flat
      ? [b.minY, b.maxY]
      : [place.y - halfHeight(part, derived), place.y + halfHeight(part, derived)];
    const [x1, x2] = [at(place.from), at(place.to)];
    marks.push(box(x1, y - high * scale, x2 - x1, (high - low) * scale, NARROW));
    if (!balloons.has(index)) balloons.set(index, { x: (x1 + x2) / 2, y: y - high * scale });
  }
  // Balloons in a row above and one below, in the order of their places.
  const sorted = [...balloons].sort(([, a], [, b]) => a.x - b.x);
  const half = Math.ceil(sorted.length / 2);
  sorted.forEach(([index, spot], i) => {
    const above = i < half;
    const k = above ? i : i - half;
    const count = above ? half : sorted.length - half;
    const bx = SIDE.x - 2 + ((SIDE.w + 4) * (k + 0.5)) / count;
    const by = above ? SIDE.y - 4 : SIDE.y + SIDE.h + 6;
    marks.push(
      ring(bx, by, 2.6, NARROW),
      text(bx, by + 0.9, String(index + 1), 1.8, { anchor: 'middle' }),
      line(bx, above ? by + 2.6 : by - 2.6, spot.x, spot.y, NARROW),
    );
  });
  return marks;
}

function partsList(parts: readonly Part[]): Mark[] {
  const marks: Mark[] = [];
  const rows = billOf(parts);
  const room = blockCorner(A3).y - LIST.y - 30;
  const h = Math.min(6, room / (rows.length + 1));
  const height = Math.min(2.2, h * 0.42);
  const columns: [number, string][] = [
    [8, ''],
    [66, 'Part'],
    [12, 'Off'],
    [42, 'Size'],
    [37, 'Material'],
  ];
  const row = (y: number, cells: readonly string[]): void => {
    let x: number = LIST.x;
    columns.forEach(([w], i) => {
      marks.push(text(x + 1, y + h * 0.7, fitted(cells[i]!, w - 2, height), height));
      x += w;
    });
    marks.push(line(LIST.x, y + h, LIST.x + LIST.w, y + h, NARROW));
  };
  marks.push(text(LIST.x, LIST.y, 'Parts', 3.5, { bold: true }));
  row(
    LIST.y + 3,
    columns.map(([, title]) => title),
  );
  rows.forEach(({ item, part, size, material }, i) =>
    row(LIST.y + 3 + (i + 1) * h, [
      String(item),
      part.label,
      String(part.quantity),
      size,
      material,
    ]),
  );
  return marks;
}

function lawChart(derived: Derived): Mark[] {
  const { law } = derived.sections[0]!;
  const marks: Mark[] = [box(CHART.x, CHART.y, CHART.w, CHART.h, NARROW)];
  const pico = law.achieved.map((value) => value * 1e12);
  const top = Math.max(...pico) * 1.05;
  const travel = law.angle.at(-1)!;
  const at = (angle: number, value: number): [number, number] => [
    CHART.x + (angle / travel) * CHART.w,
    CHART.y + CHART.h - (value / top) * CHART.h,
  ];
  const decade = 10 ** Math.floor(Math.log10(top));
  const step = [1, 0.5, 0.2].map((f) => f * decade).find((s) => top / s >= 4) ?? decade / 5;
  for (let value = 0; value <= top; value += step) {
    const [, y] = at(0, value);
    marks.push(line(CHART.x, y, CHART.x + CHART.w, y, 0.1));
    marks.push(
      text(CHART.x - 1.5, y + 0.8, String(Number(value.toPrecision(4))), 1.8, {
        anchor: 'end',
      }),
    );
  }
  for (let degrees = 0; degrees <= (travel * 180) / Math.PI + 1e-6; degrees += 30) {
    const [x] = at((degrees * Math.PI) / 180, 0);
    marks.push(line(x, CHART.y, x, CHART.y + CHART.h, 0.1));
    marks.push(text(x, CHART.y + CHART.h + 3.5, `${degrees}°`, 1.8, { anchor: 'middle' }));
  }
  const path = pico
    .map(
      (value, i) =>
        `${i === 0 ? 'M' : 'L'}${at(law.angle[i]!, value)
          .map((v) => v.toFixed(3))
          .join(' ')}`,
    )
    .join('');
  marks.push({ kind: 'stroke', path, width: WIDE });
  marks.push(
    text(
      CHART.x,
      CHART.y - 3,
      'Total capacitance of section 1, pF, over the shaft angle from the open stop',
      2.5,
    ),
  );
  return marks;
}

/** Lines that there is room for between the views and the cautions. */
const WAIVER_LINES = 4;

/** What was released in spite of a failing check; the manifest has all of it. */
function waiverNotes(waivers: readonly string[]): Mark[] {
  const shown =
    waivers.length > WAIVER_LINES
      ? [
          ...waivers.slice(0, WAIVER_LINES - 1),
          `and ${waivers.length - WAIVER_LINES + 1} more: see the manifest`,
        ]
      : waivers;
  return shown.map((waiver, i) =>
    text(25, 147 + 4 * i, fitted(`Released in spite of: ${waiver}`, 120, 2), 2, { bold: true }),
  );
}

export function assemblySheet(
  derived: Derived,
  name: string,
  sheet: Omit<Sheet, 'scale' | 'title' | 'material'>,
  waivers: readonly string[],
): Sketch {
  const { parts, placed } = assemblyOf(derived);
  const from = Math.min(...placed.map((place) => place.from));
  const to = Math.max(...placed.map((place) => place.to));
  const around = 2 * derived.stack.outerRadius;
  const scale = Math.min(
    scaleFor({ w: around, h: around }, PLAN),
    scaleFor({ w: to - from, h: around }, SIDE),
  );
  const y = SIDE.y + SIDE.h / 2 + derived.stack.outerRadius * scale;
  const at = (z: number): number => SIDE.x + (z - from) * scale;
  return {
    width: A3.width,
    height: A3.height,
    marks: [
      ...frameMarks(A3),
      ...planView(derived, scale),
      ...sideView(derived, parts, placed, scale, from),
      ...across(at(0), at(derived.stack.depth), y, SIDE.y + SIDE.h + 20, derived.stack.depth),
      ...lawChart(derived),
      ...partsList(parts),
      ...waiverNotes(waivers),
      text(
        25,
        165,
        'Both outlines as they are drawn, at mesh angle 0. High voltage and radio frequency',
        2.2,
      ),
      text(
        25,
        169.2,
        'injure and kill: discharge, cover, and follow local codes and licensed practice.',
        2.2,
      ),
      ...titleBlock(A3, {
        ...sheet,
        title: name,
        material: 'see list',
        scale: writtenScale(scale),
      }),
      ...revisionTable(A3, {
        ...sheet,
        title: name,
        material: 'see list',
        scale: writtenScale(scale),
      }),
    ],
  };
}
