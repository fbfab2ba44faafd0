/** What a dial has to mark: values of the finished law, at the angles where they stand. */

import type { SectionResult } from '../derived';
import { resonantCapacitance, resonantFrequency } from '../resonance';

export type DialQuantity = 'frequency' | 'wavelength' | 'capacitance';

/** Speed of light, m/s (exact by the definition of the metre). */
const LIGHT = 299_792_458;

export interface DialMark {
  /** Hz, m or F. */
  readonly value: number;
  /** Shaft angle from the open stop, rad. */
  readonly angle: number;
  readonly rank: 'long' | 'middle' | 'short';
  /** Written beside a long mark that has room for it. */
  readonly label: string | null;
}

/** Value of a dial's quantity for a total capacitance. @param inductance H */
export function dialValue(total: number, quantity: DialQuantity, inductance: number): number {
  if (quantity === 'capacitance') return total;
  const frequency = resonantFrequency(total, inductance);
  return quantity === 'frequency' ? frequency : LIGHT / frequency;
}

/** Scale from a value to what is written on the dial, by its largest value. */
export function dialUnit(
  quantity: DialQuantity,
  largest: number,
): { scale: number; unit: string } {
  if (quantity === 'capacitance') return { scale: 1e12, unit: 'pF' };
  if (quantity === 'wavelength') return { scale: 1, unit: 'm' };
  return largest >= 3e6 ? { scale: 1e-6, unit: 'MHz' } : { scale: 1e-3, unit: 'kHz' };
}

export interface Spacing {
  /** Length along the scale for a shaft angle of 1 rad, mm. */
  readonly perRadian: number;
  /** Nearest that two marks may stand, and room that a number takes, mm. */
  readonly apart: number;
  readonly numberRoom: number;
}

/** Total capacitance for a value of a dial's quantity, F. */
function totalFor(value: number, quantity: DialQuantity, inductance: number): number {
  if (quantity === 'capacitance') return value;
  return resonantCapacitance(quantity === 'frequency' ? value : LIGHT / value, inductance);
}

/** Divisions of a step, in turn: 10 into two 5s, 5 into five 1s, and so on. */
const DIVISIONS = [2, 5] as const;
const DEEPEST = 7;

/**
 * Marks over the law of a finished section. Each step is divided again wherever all its parts
 * stand far enough apart, so that a crowded end has fewer; numbers stand at the roundest values
 * that leave room for them.
 */
export function dialMarks(
  { law, inductance }: Pick<SectionResult, 'law' | 'inductance'>,
  quantity: DialQuantity,
  { perRadian, apart, numberRoom }: Spacing,
): DialMark[] {
  const coil = inductance ?? 1;
  const inside = law.angle.flatMap((angle, i) =>
    angle >= law.from - 1e-12 && angle <= law.to + 1e-12 ? [i] : [],
  );
  const angles = inside.map((i) => law.angle[i]!);
  const totals = inside.map((i) => law.achieved[i]!);
  const ends = [
    dialValue(totals[0]!, quantity, coil),
    dialValue(totals.at(-1)!, quantity, coil),
  ];
  const { scale } = dialUnit(quantity, Math.max(...ends));
  const [low, high] = [Math.min(...ends) * scale, Math.max(...ends) * scale];

  const angleAt = (value: number): number => {
    const total = totalFor(value / scale, quantity, coil);
    let i = 1;
    while (i < totals.length - 1 && totals[i]! < total) i += 1;
    const [a, b] = [totals[i - 1]!, totals[i]!];
    return angles[i - 1]! + ((total - a) / (b - a)) * (angles[i]! - angles[i - 1]!);
  };
  const within = (value: number): boolean =>
    value >= low * (1 - 1e-9) && value <= high * (1 + 1e-9);
  const far = (a: number, b: number, room: number): boolean =>
    Math.abs(angleAt(a) - angleAt(b)) * perRadian >= room;

  /** Value and the depth at which it came: 0 for the roundest. */
  const found = new Map<number, number>();
  const divide = (from: number, step: number, depth: number): void => {
    if (depth > DEEPEST) return;
    const parts = DIVISIONS[depth % 2]!;
    const fine = step / parts;
    const all = Array.from({ length: parts + 1 }, (_, k) => from + k * fine).filter(within);
    if (all.some((value, i) => i > 0 && !far(all[i - 1]!, value, apart))) return;
    for (let k = 1; k < parts; k++) {
      const value = Number((from + k * fine).toPrecision(12));
      if (within(value)) found.set(value, depth + 1);
    }
    for (let k = 0; k < parts; k++) {
      const begin = from + k * fine;
      if (begin < high && begin + fine > low) divide(begin, fine, depth + 1);
    }
  };
  const step = 10 ** Math.ceil(Math.log10(high - low));
  for (let k = Math.floor(low / step); k * step <= high; k++) {
    if (within(k * step)) found.set(k * step, 0);
    divide(k * step, step, 0);
  }

  const values = [...found.keys()].sort((a, b) => found.get(a)! - found.get(b)! || a - b);
  const numbers: number[] = [];
  for (const value of values) {
    if (numbers.every((other) => far(other, value, numberRoom))) numbers.push(value);
  }
  return values.map((value): DialMark => {
    const numbered = numbers.includes(value);
    return {
      value: value / scale,
      angle: angleAt(value),
      rank: numbered ? 'long' : found.get(value)! % 2 === 1 ? 'middle' : 'short',
      label: numbered ? String(Number(value.toPrecision(6))) : null,
    };
  });
}
