/** A round dial of several bands, an arc for each, one inside the other. True size. */

import type { SectionResult, Turn } from '../derived';
import type { Point } from '../outline';
import { arc, line, ring, text, widthOf, type Mark, type Sketch } from '../sketch/sketch';
import {
  APART,
  checkBar,
  CHECK_WIDTH,
  DASH,
  LENGTHS,
  NUMBER,
  pointerStrip,
  ROOM,
  STRIP_ROOM,
  THIN,
  WIDTHS,
} from './furniture';
import { lawInverse } from './law-inverse';
import { dialMarks } from './marks';
import { dialBearing, EDGE, lettered, MARGIN, numberBox, OPEN, roomy } from './round';
import { checkSettings, DialError, type DialSettings } from './settings';

/** mm. From the arc of a band to the next one inside. */
const PITCH = LENGTHS.long + NUMBER + 3 * ROOM;

/** mm. Inside the innermost numbers at least. */
const LEAST_INSIDE = 10;

const TURN = 2 * Math.PI;

export interface DialBand {
  readonly name: string;
  /** What the band's circuit has over the turn. */
  readonly scale: Pick<SectionResult, 'law' | 'inductance'>;
}

/** @throws DialError where an arc or a name has no room, or a band no falling frequency */
export function bandsDial(
  bands: readonly DialBand[],
  turn: Turn,
  settings: DialSettings,
): Sketch {
  checkSettings(settings);
  const { radius, hole, title } = settings;
  const inside = radius - bands.length * PITCH - hole / 2;
  if (inside < LEAST_INSIDE) {
    const least = Math.ceil(radius + LEAST_INSIDE - inside);
    throw new DialError(
      `Radius: ${radius} mm has no room for ${bands.length} bands; give at least ${least} mm.`,
    );
  }
  const size = Math.max(2 * (radius + MARGIN), CHECK_WIDTH + 2 * MARGIN);
  const axis: Point = { x: size / 2, y: radius + MARGIN };
  const marks = bands.flatMap((band, i) =>
    bandArc(band, turn, settings, radius - i * PITCH, axis),
  );
  const { x, y } = axis;
  const below = y + radius + MARGIN;
  const strip = Math.max(STRIP_ROOM, settings.moves === 'pointer' ? hole + 12 : 0);
  const free = radius - bands.length * PITCH;
  const height = title ? Math.min(3.5, (1.6 * free) / widthOf(title, 1)) : 0;
  return {
    width: size,
    height: below + 10 + strip,
    marks: [
      ring(x, y, radius, 0.25),
      ...marks,
      ...(hole > 0 ? [ring(x, y, hole / 2, 0.25)] : []),
      line(x - 2, y, x + 2, y, THIN),
      line(x, y - 2, x, y + 2, THIN),
      ...(title
        ? [text(x, y + hole / 2 + 3 + height, title, height, { anchor: 'middle', bold: true })]
        : []),
      ...checkBar(MARGIN, below, true),
      ...pointerStrip(settings, MARGIN, below + 8 + (strip - STRIP_ROOM) / 2),
    ],
  };
}

function bandArc(
  { name, scale }: DialBand,
  { travel }: Turn,
  settings: DialSettings,
  radius: number,
  axis: Point,
): Mark[] {
  const { ratio } = settings;
  const { law } = scale;
  const bearing = (shaft: number): number => dialBearing(scale, settings, shaft);
  const spot = (shaft: number, r: number): [number, number] => [
    axis.x + r * Math.sin(bearing(shaft)),
    axis.y - r * Math.cos(bearing(shaft)),
  ];
  const { unit } = lawInverse(scale, 'frequency');
  const words = `${name}, ${unit}`;
  // Behind the meshed stop, where the ring is open.
  const wide = (widthOf(words, NUMBER) + 4 * ROOM) / (radius - PITCH);
  if (travel * ratio + wide > TURN - OPEN) {
    throw new DialError(
      `Lettering: “${words}” has no room behind its arc; shorten it, or take a larger radius.`,
    );
  }
  const marks = dialMarks(scale, 'frequency', {
    perRadian: (radius - EDGE - LENGTHS.long) * ratio,
    apart: APART,
    boxOf: (label, shaft) => roomy(numberBox(label, bearing(shaft), radius, axis)),
  });
  const scaleRadius = radius - EDGE;
  const ends = [bearing(law.from), bearing(law.to)].map((angle) => angle - Math.PI / 2);
  return [
    arc(axis.x, axis.y, scaleRadius, Math.min(...ends), Math.max(...ends), WIDTHS.long),
    ...marks.map(({ angle, rank }) =>
      line(
        ...spot(angle, scaleRadius),
        ...spot(angle, scaleRadius - LENGTHS[rank]),
        WIDTHS[rank],
      ),
    ),
    ...marks.flatMap(({ label, angle }) =>
      label === null ? [] : [lettered(label, numberBox(label, bearing(angle), radius, axis))],
    ),
    ...[0, travel].map((stop) =>
      line(...spot(stop, scaleRadius), ...spot(stop, scaleRadius - LENGTHS.long), THIN, DASH),
    ),
    lettered(words, numberBox(words, bearing(travel + wide / 2 / ratio), radius, axis)),
  ];
}
