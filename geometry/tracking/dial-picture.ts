/** An existing dial: marks picked on its picture, and the table of the law that they make. */

import { KernelError } from '../error';
import type { LawPoint } from '../law-points';
import { formatQuantity } from '../quantity';

/** On the picture, in any unit; x to the right, y down. */
export interface PicturePoint {
  readonly x: number;
  readonly y: number;
}

/** A mark whose angle on the shaft is known, rad. */
export interface ReferenceMark extends PicturePoint {
  readonly angle: number;
}

/** A mark with what is printed beside it, Hz. */
export interface FrequencyMark extends PicturePoint {
  readonly frequency: number;
}

export interface DialPicture {
  readonly centre: PicturePoint;
  readonly references: readonly [ReferenceMark, ReferenceMark];
}

/** rad. Reference marks nearer than this say too little of the scale. */
const LEAST_APART = (5 * Math.PI) / 180;

const degrees = (value: number): string => formatQuantity(value, 'angle', 4);

/** From 0 up to a full turn. */
const positive = (angle: number): number =>
  ((angle % (2 * Math.PI)) + 2 * Math.PI) % (2 * Math.PI);

/**
 * Turns a place on the picture into an angle on the shaft, rad. The way round is the one in which
 * the two marks lie as far apart on the picture as on the shaft; what is left between the two, a
 * drive or a picture taken askew, is spread evenly.
 * @returns the reading, and how far apart the marks lie on the picture, rad
 * @throws KernelError where the marks lie together or on the centre
 */
export function dialReading({ centre, references: [first, second] }: DialPicture): {
  readonly angleAt: (point: PicturePoint) => number;
  readonly seenApart: number;
} {
  const bearing = ({ x, y }: PicturePoint, path: string): number => {
    if (x === centre.x && y === centre.y) {
      throw new KernelError(
        'out-of-bounds',
        path,
        0,
        'Mark on the centre: pick it further out',
      );
    }
    return Math.atan2(y - centre.y, x - centre.x);
  };
  const from = bearing(first, 'references.0');
  const clockwise = positive(bearing(second, 'references.1') - from);
  const apart = second.angle - first.angle;
  if (
    Math.min(clockwise, 2 * Math.PI - clockwise) < LEAST_APART ||
    Math.abs(apart) < LEAST_APART
  ) {
    throw new KernelError(
      'out-of-bounds',
      'references.1',
      second.angle,
      `Second reference mark: it lies with the first; pick two at least ${degrees(LEAST_APART)} apart, best near both ends of the scale`,
    );
  }
  const size = Math.abs(apart);
  const way = Math.abs(clockwise - size) <= Math.abs(2 * Math.PI - clockwise - size) ? 1 : -1;
  const seenApart = way > 0 ? clockwise : 2 * Math.PI - clockwise;
  return {
    seenApart,
    angleAt: (point) => {
      const middle = seenApart / 2;
      const turned = positive(way * (bearing(point, 'marks') - from) - middle + Math.PI);
      return first.angle + ((turned + middle - Math.PI) / seenApart) * apart;
    },
  };
}

/**
 * Rows of a dial as a law's table: angles from the end of the highest frequency on, rising. A dial
 * whose frequency rises with its angle is counted from its other end.
 * @param rows shaft angle, rad, and frequency, Hz, in any order
 * @throws KernelError where two rows stand at one angle, or the frequency turns
 */
export function rowsOfDial(rows: readonly LawPoint[]): LawPoint[] {
  const sorted = [...rows].sort(([a], [b]) => a - b);
  const [first, last] = [sorted[0], sorted.at(-1)];
  if (!first || !last || sorted.length < 3) {
    throw new KernelError(
      'out-of-bounds',
      'rows',
      rows.length,
      `Rows of the dial: ${rows.length} are too few; give at least 3`,
    );
  }
  const rises = last[1] > first[1];
  const counted = rises
    ? sorted.map(([angle, frequency]): LawPoint => [last[0] - angle, frequency]).reverse()
    : sorted.map(([angle, frequency]): LawPoint => [angle - first[0], frequency]);
  const wrong = counted.findIndex(
    ([angle, frequency], i) =>
      i > 0 && (angle <= counted[i - 1]![0] || frequency >= counted[i - 1]![1]),
  );
  if (wrong >= 0) {
    const at = (row: LawPoint): string => formatQuantity(row[1], 'frequency', 5);
    throw new KernelError(
      'out-of-bounds',
      'rows',
      counted[wrong]![1],
      `Rows of the dial: ${at(counted[wrong]!)} does not lie between its neighbours as its angle does (beside ${at(counted[wrong - 1]!)}); a frequency must go one way all along`,
    );
  }
  return counted;
}

/** Marks picked on a picture as a law's table. @throws KernelError as its two steps do */
export function rowsOfPicture(
  picture: DialPicture,
  marks: readonly FrequencyMark[],
): LawPoint[] {
  const { angleAt } = dialReading(picture);
  return rowsOfDial(marks.map((mark): LawPoint => [angleAt(mark), mark.frequency]));
}
