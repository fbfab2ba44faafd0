/** A round dial on the shaft or behind a drive, true size. */

import type { SectionResult, Turn } from '../derived';
import type { Point } from '../outline';
import { arc, line, ring, text, widthOf, type Mark, type Sketch } from '../sketch/sketch';
import type { Box } from './box';
import {
  APART,
  checkBar,
  CHECK_WIDTH,
  DASH,
  directionOf,
  LENGTHS,
  NUMBER,
  pointerStrip,
  quantityLabels,
  ROOM,
  STRIP_ROOM,
  THIN,
  WIDTHS,
} from './furniture';
import { lawInverse } from './law-inverse';
import { dialMarks } from './marks';
import { DialError, type DialSettings } from './settings';

const TURN = 2 * Math.PI;
/** rad. A round scale leaves this much open. */
export const OPEN = (10 * Math.PI) / 180;
/** From the cut edge to the line that the marks stand on; from the edge of the paper to the cut. */
export const EDGE = 1;
export const MARGIN = 10;

/** Bearing of a shaft angle on the dial, rad clockwise from the top. */
export function dialBearing(
  { law }: Pick<SectionResult, 'law'>,
  settings: Pick<DialSettings, 'ratio' | 'sense' | 'moves' | 'place' | 'open'>,
  shaft: number,
): number {
  const { ratio, place, open } = settings;
  const from = place === 'open' ? 0 : (law.from + law.to) / 2;
  const at = place === 'open' ? open : place === 'upper' ? 0 : Math.PI;
  return at + directionOf(settings) * (shaft - from) * ratio;
}

/** Where a number is lettered: inside its mark, along the ring, never upside down. */
export function numberBox(label: string, bearing: number, radius: number, axis: Point): Box {
  const width = widthOf(label, NUMBER);
  const outer = radius - EDGE - LENGTHS.long - ROOM;
  const middle = Math.sqrt(outer ** 2 - (width / 2) ** 2) - NUMBER / 2;
  const turned = bearing - TURN * Math.round(bearing / TURN);
  return {
    x: axis.x + middle * Math.sin(bearing),
    y: axis.y - middle * Math.cos(bearing),
    width,
    height: NUMBER,
    turn: Math.abs(turned) > Math.PI / 2 + 1e-9 ? turned + Math.PI : turned,
  };
}

export const roomy = (box: Box): Box => ({
  ...box,
  width: box.width + 1.5 * ROOM,
  height: box.height + ROOM,
});

export function lettered(label: string, { x, y, turn }: Box): Mark {
  return text(
    x - (Math.sin(turn) * NUMBER) / 2,
    y + (Math.cos(turn) * NUMBER) / 2,
    label,
    NUMBER,
    { anchor: 'middle', turn: (turn * 180) / Math.PI },
  );
}

/** Title and unit where the ring is open, as large as they fit. */
function headings(
  { title, quantity, hole }: DialSettings,
  { unit, free, axis, above }: { unit: string; free: number; axis: Point; above: boolean },
): Mark[] {
  const nearest = hole / 2 + 2;
  const lines = [
    ...(title ? [{ written: title, most: 3.5, bold: true }] : []),
    { written: `${quantityLabels[quantity]}, ${unit}`, most: 2.5, bold: false },
  ];
  const depth = lines.length * 5;
  const away = Math.max(nearest, (free - depth) / 2);
  // Half the chord of the free circle at the far end of the lines.
  const chord = Math.sqrt(Math.max(free ** 2 - (away + depth) ** 2, 0));
  return lines.map(({ written, most, bold }, i) => {
    const height = Math.min(most, (2 * chord) / widthOf(written, 1));
    if (height < 1.4) {
      throw new DialError(
        `Lettering: “${written}” does not fit inside the numbers; shorten it, or take a larger radius or a smaller hole.`,
      );
    }
    const y = axis.y + (above ? -away - depth : away) + (i + 1) * 5 - 1;
    return text(axis.x, y, written, height, { anchor: 'middle', bold });
  });
}

/** @throws DialError */
export function roundDial(section: SectionResult, turn: Turn, settings: DialSettings): Sketch {
  const { radius, ratio, hole, quantity } = settings;
  const { law } = section;
  if (turn.travel * ratio > TURN - OPEN) {
    const most = Math.floor((1000 * (TURN - OPEN)) / turn.travel) / 1000;
    throw new DialError(
      `The dial would turn more than once: take a ratio of at most ${most}, or a straight scale.`,
    );
  }
  const size = Math.max(2 * (radius + MARGIN), CHECK_WIDTH + 2 * MARGIN);
  const axis: Point = { x: size / 2, y: radius + MARGIN };
  const { x: cx, y: cy } = axis;
  const bearing = (shaft: number): number => dialBearing(section, settings, shaft);
  const spot = (shaft: number, r: number): [number, number] => [
    cx + r * Math.sin(bearing(shaft)),
    cy - r * Math.cos(bearing(shaft)),
  ];
  const boxOf = (label: string, shaft: number): Box =>
    numberBox(label, bearing(shaft), radius, axis);
  const marks = dialMarks(section, quantity, {
    perRadian: (radius - EDGE - LENGTHS.long) * ratio,
    apart: APART,
    boxOf: (label, shaft) => roomy(boxOf(label, shaft)),
  });
  const numbers = marks.flatMap(({ label, angle }) =>
    label === null ? [] : [{ label, box: boxOf(label, angle) }],
  );
  const free =
    Math.min(
      radius - EDGE - LENGTHS.long,
      ...numbers.map(({ box }) => Math.hypot(box.x - cx, box.y - cy) - NUMBER / 2),
    ) - ROOM;
  if (free < hole / 2 + 2) {
    const least = Math.ceil(radius + hole / 2 + 2 - free);
    throw new DialError(
      `Hole: ${hole} mm leaves no room inside the numbers; take a radius of at least ${least} mm or a smaller hole.`,
    );
  }
  const ends = [bearing(law.from), bearing(law.to)].map((angle) => angle - Math.PI / 2);
  const scaleRadius = radius - EDGE;
  const stops = [0, turn.travel].filter(
    (stop, i) => Math.abs(stop - (i === 0 ? law.from : law.to)) * ratio * radius > APART,
  );
  const { unit } = lawInverse(section, quantity);
  const below = cy + radius + MARGIN;
  const strip = Math.max(STRIP_ROOM, settings.moves === 'pointer' ? hole + 12 : 0);
  return {
    width: size,
    height: below + 10 + strip,
    marks: [
      ring(cx, cy, radius, 0.25),
      arc(cx, cy, scaleRadius, Math.min(...ends), Math.max(...ends), WIDTHS.long),
      ...marks.map(({ angle, rank }) =>
        line(
          ...spot(angle, scaleRadius),
          ...spot(angle, scaleRadius - LENGTHS[rank]),
          WIDTHS[rank],
        ),
      ),
      ...numbers.map(({ label, box }) => lettered(label, box)),
      ...stops.map((stop) =>
        line(...spot(stop, scaleRadius), ...spot(stop, scaleRadius - LENGTHS.long), THIN, DASH),
      ),
      ...(hole > 0 ? [ring(cx, cy, hole / 2, 0.25)] : []),
      line(cx - 2, cy, cx + 2, cy, THIN),
      line(cx, cy - 2, cx, cy + 2, THIN),
      ...headings(settings, {
        unit,
        free,
        axis,
        above: Math.cos(bearing((law.from + law.to) / 2)) < -1e-9,
      }),
      ...checkBar(MARGIN, below, stops.length > 0),
      ...pointerStrip(settings, MARGIN, below + 8 + (strip - STRIP_ROOM) / 2),
    ],
  };
}
