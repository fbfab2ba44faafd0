/** A straight scale along a cord, true size: its pointer goes as far as the drum winds. */

import type { SectionResult, Turn } from '../derived';
import { line, text, widthOf, type Mark, type Sketch } from '../sketch/sketch';
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

const MARGIN = 12;
/** Where the line lies that the marks hang from. */
const LINE = 16;
/** Longest that is drawn. */
const LONGEST = 3000;

/** @throws DialError */
export function straightDial(
  section: SectionResult,
  turn: Turn,
  settings: DialSettings,
): Sketch {
  const { ratio, drum, title, quantity } = settings;
  const perRadian = (drum * ratio) / (2 * Math.PI);
  const length = turn.travel * perRadian;
  if (length > LONGEST) {
    throw new DialError(
      `The scale would be ${Math.round(length)} mm long, and ${LONGEST} mm is the most: take a smaller drum or ratio.`,
    );
  }
  const right = directionOf(settings) === 1;
  const at = (shaft: number): number =>
    MARGIN + (right ? shaft : turn.travel - shaft) * perRadian;
  const below = LINE + LENGTHS.long + ROOM;
  const boxOf = (label: string, shaft: number): Box => ({
    x: at(shaft),
    y: below + NUMBER / 2,
    width: widthOf(label, NUMBER) + 1.5 * ROOM,
    height: NUMBER,
    turn: 0,
  });
  const marks = dialMarks(section, quantity, { perRadian, apart: APART, boxOf });
  const { from, to } = section.law;
  const stops = [0, turn.travel].filter(
    (stop, i) => Math.abs(stop - (i === 0 ? from : to)) * perRadian > APART,
  );
  const { unit } = lawInverse(section, quantity);
  const heading = `${quantityLabels[quantity]}, ${unit}`;
  // Title and unit stand on one line where it is long enough.
  const apart = length > widthOf(title, 3.5) + widthOf(heading, NUMBER) + 5;
  const bar = below + NUMBER + 9;
  return {
    width: Math.max(length, CHECK_WIDTH, widthOf(title, 3.5)) + 2 * MARGIN,
    height: bar + 10 + STRIP_ROOM,
    marks: [
      line(MARGIN, LINE, MARGIN + length, LINE, WIDTHS.long),
      ...marks.flatMap(({ angle, rank, label }): Mark[] => [
        line(at(angle), LINE, at(angle), LINE + LENGTHS[rank], WIDTHS[rank]),
        ...(label === null
          ? []
          : [text(at(angle), below + NUMBER, label, NUMBER, { anchor: 'middle' })]),
      ]),
      ...stops.map((stop) => line(at(stop), LINE, at(stop), LINE + LENGTHS.long, THIN, DASH)),
      ...(title ? [text(MARGIN, LINE - (apart ? 5 : 8), title, 3.5, { bold: true })] : []),
      text(
        apart ? MARGIN + length : MARGIN,
        LINE - (apart ? 5 : 3),
        heading,
        NUMBER,
        apart ? { anchor: 'end' } : {},
      ),
      ...checkBar(MARGIN, bar, stops.length > 0),
      ...pointerStrip(settings, MARGIN, bar + 8),
    ],
  };
}
