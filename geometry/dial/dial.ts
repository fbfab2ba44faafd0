/** A dial to print, true size: round on the shaft or a drive, or straight along a cord. */

import type { SectionResult, Turn } from '../derived';
import { arc, line, ring, text, type Mark, type Sketch } from '../sketch/sketch';
import { dialMarks, dialUnit, dialValue, type DialQuantity } from './marks';

export interface DialSettings {
  readonly quantity: DialQuantity;
  readonly form: 'round' | 'straight';
  /** Outer radius of a round scale, mm. */
  readonly radius: number;
  /** Dial or drum turns for one turn of the shaft. */
  readonly ratio: number;
  /** Circumference of the drum that moves the pointer of a straight scale, mm. */
  readonly drum: number;
  /** Does the value read rise clockwise, or to the right? Follows from how it is mounted. */
  readonly sense: 'clockwise' | 'anticlockwise';
  /** Hole for the shaft, mm; 0 for none. */
  readonly hole: number;
  readonly title: string;
}

/** Why a dial can't be, with what would work. */
export class DialError extends Error {
  override readonly name = 'DialError';
}

/** rad. A round scale leaves this much open. */
const OPEN = (10 * Math.PI) / 180;

const APART = 1.4;
const NUMBER = 2.5;
const LENGTHS = { long: 6, middle: 4, short: 2.5 } as const;
const WIDTHS = { long: 0.35, middle: 0.25, short: 0.18 } as const;

const labels: Record<DialQuantity, string> = {
  frequency: 'Frequency',
  wavelength: 'Wavelength',
  capacitance: 'Capacitance',
};

const CHECK = 50;

/** A bar by which one sees whether the printer kept the size. */
function checkBar(x: number, y: number): Mark[] {
  return [
    line(x, y, x + CHECK, y, 0.25),
    line(x, y - 1.5, x, y + 1.5, 0.25),
    line(x + CHECK, y - 1.5, x + CHECK, y + 1.5, 0.25),
    text(x + CHECK + 2, y + 0.9, `${CHECK} mm when printed at full size`, 1.8),
  ];
}

function marksFor(
  section: SectionResult,
  { quantity }: DialSettings,
  perRadian: number,
): ReturnType<typeof dialMarks> {
  if (section.inductance === null && quantity !== 'capacitance') {
    throw new DialError(
      'Frequency and wavelength need a coil: give the range as band and coil, or mark capacitance.',
    );
  }
  return dialMarks(section, quantity, { perRadian, apart: APART, numberRoom: 3.2 * NUMBER });
}

/** Where a mark stands on a round dial, rad clockwise from the top: the law's middle is up. */
export function dialBearing(
  { law }: Pick<SectionResult, 'law'>,
  { ratio, sense }: Pick<DialSettings, 'ratio' | 'sense'>,
  shaft: number,
): number {
  const middle = (law.from + law.to) / 2;
  return (sense === 'clockwise' ? 1 : -1) * (shaft - middle) * ratio;
}

function round(section: SectionResult, turn: Turn, settings: DialSettings): Sketch {
  const { radius, ratio, hole, title, quantity } = settings;
  if (turn.travel * ratio > 2 * Math.PI - OPEN) {
    const most = (2 * Math.PI - OPEN) / turn.travel;
    throw new DialError(
      `The dial would turn more than once: take a ratio of at most ${most.toPrecision(3)}, or a straight scale.`,
    );
  }
  const perRadian = radius * ratio;
  const marks = marksFor(section, settings, perRadian);
  const margin = 10;
  const size = 2 * (radius + margin);
  const c = size / 2;
  const at = (shaft: number): number => dialBearing(section, settings, shaft) - Math.PI / 2;
  const spot = (angle: number, r: number): [number, number] => [
    c + r * Math.cos(angle),
    c + r * Math.sin(angle),
  ];
  const [from, to] = [at(section.law.from), at(section.law.to)];
  const drawn: Mark[] = [
    ring(c, c, radius, 0.25),
    arc(c, c, radius - 1, Math.min(from, to), Math.max(from, to), 0.35),
  ];
  for (const { angle, rank, label } of marks) {
    const bearing = at(angle);
    const inner = radius - 1 - LENGTHS[rank];
    drawn.push(line(...spot(bearing, radius - 1), ...spot(bearing, inner), WIDTHS[rank]));
    if (label) {
      const [x, y] = spot(bearing, inner - 1 - NUMBER / 2);
      const degrees = ((bearing + Math.PI / 2) * 180) / Math.PI;
      const turned = (((degrees % 360) + 540) % 360) - 180;
      const upright = Math.abs(turned) > 90 ? turned + 180 : turned;
      const rad = (upright * Math.PI) / 180;
      drawn.push(
        text(
          x - (Math.sin(rad) * NUMBER) / 2,
          y + (Math.cos(rad) * NUMBER) / 2,
          label,
          NUMBER,
          {
            anchor: 'middle',
            turn: upright,
          },
        ),
      );
    }
  }
  const largest = Math.max(
    ...[section.law.from, section.law.to].map((_, i) =>
      dialValue(section.law.achieved.at(i === 0 ? 0 : -1)!, quantity, section.inductance ?? 1),
    ),
  );
  const { unit } = dialUnit(quantity, largest);
  if (hole > 0) {
    drawn.push(ring(c, c, hole / 2, 0.25));
    drawn.push(line(c - hole, c, c + hole, c, 0.13), line(c, c - hole, c, c + hole, 0.13));
  }
  drawn.push(
    text(c, c + radius * 0.3, title, 3.5, { anchor: 'middle', bold: true }),
    text(c, c + radius * 0.3 + 5.5, `${labels[quantity]}, ${unit}`, 2.5, { anchor: 'middle' }),
    ...checkBar(margin, size + 4),
  );
  return { width: size, height: size + 10, marks: drawn };
}

function straight(section: SectionResult, turn: Turn, settings: DialSettings): Sketch {
  const { ratio, drum, sense, title, quantity } = settings;
  const perRadian = (drum * ratio) / (2 * Math.PI);
  const marks = marksFor(section, settings, perRadian);
  const margin = 12;
  const length = turn.travel * perRadian;
  const y = 16;
  const at = (shaft: number): number =>
    margin + (sense === 'clockwise' ? shaft : turn.travel - shaft) * perRadian;
  const drawn: Mark[] = [line(margin, y, margin + length, y, 0.35)];
  for (const { angle, rank, label } of marks) {
    const x = at(angle);
    drawn.push(line(x, y, x, y + LENGTHS[rank], WIDTHS[rank]));
    if (label) {
      drawn.push(text(x, y + LENGTHS.long + 1 + NUMBER, label, NUMBER, { anchor: 'middle' }));
    }
  }
  const largest = dialValue(section.law.achieved[0]!, quantity, section.inductance ?? 1);
  const { unit } = dialUnit(
    quantity,
    Math.max(
      largest,
      dialValue(section.law.achieved.at(-1)!, quantity, section.inductance ?? 1),
    ),
  );
  drawn.push(
    text(margin, y - 6, title, 3.5, { bold: true }),
    text(margin + length, y - 6, `${labels[quantity]}, ${unit}`, 2.5, { anchor: 'end' }),
    ...checkBar(margin, y + 18),
  );
  return { width: Math.max(length, CHECK + 60) + 2 * margin, height: y + 24, marks: drawn };
}

/** @throws DialError */
export function dialOf(section: SectionResult, turn: Turn, settings: DialSettings): Sketch {
  const { form, radius, ratio, drum } = settings;
  if (!(ratio > 0 && ratio <= 100))
    throw new DialError(`A ratio of ${ratio} is none; give more than 0, up to 100.`);
  if (form === 'round') {
    if (!(radius >= 15 && radius <= 200))
      throw new DialError(`A radius of ${radius} mm is out of range; give 15 to 200 mm.`);
    return round(section, turn, settings);
  }
  if (!(drum >= 10 && drum <= 2000))
    throw new DialError(`A drum of ${drum} mm round is out of range; give 10 to 2000 mm.`);
  return straight(section, turn, settings);
}
