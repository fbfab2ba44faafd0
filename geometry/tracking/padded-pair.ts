/**
 * Two equal sections on one shaft, one of them with a padder in series and a trimmer across it.
 * F. E. Terman, Radio Engineers' Handbook (McGraw-Hill, 1943), gives the three-point solution
 * (from memory); derived again from the circuit.
 *
 * The plain circuit has its coil across its section and stray: that of the signal where the
 * oscillator works above, that of the oscillator where it works below. The other one is tuned
 * higher by the intermediate frequency and is the padded one.
 */

import { KernelError } from '../error';
import { formatQuantity } from '../quantity';
import { resonantCapacitance } from '../resonance';

/** On which side of the signal the oscillator works. */
export type OscillatorSide = 'above' | 'below';

export interface Conversion {
  /** Intermediate frequency, Hz. */
  readonly intermediate: number;
  readonly side: OscillatorSide;
  /** Coil of the plain circuit, H. */
  readonly plainCoil: number;
}

export interface PaddedPair extends Conversion {
  /** Coil of the padded circuit, H. */
  readonly paddedCoil: number;
  /** In series with the section, F; null where there is none. */
  readonly padder: number | null;
  /** Across the section, beyond the stray that the plain circuit has, F. */
  readonly trimmer: number;
}

const hertz = (value: number): string => formatQuantity(value, 'frequency', 5);

/** What the plain circuit is tuned to for a signal, Hz. */
export function plainFrequency({ intermediate, side }: Conversion, signal: number): number {
  return side === 'above' ? signal : signal - intermediate;
}

/** Total capacitance of the plain circuit for a signal, F. */
export function plainCapacitance(conversion: Conversion, signal: number): number {
  return resonantCapacitance(plainFrequency(conversion, signal), conversion.plainCoil);
}

/** What the padded circuit is tuned to where the plain one is right for a signal, Hz. */
export function paddedFrequency(pair: PaddedPair, signal: number): number {
  const across = plainCapacitance(pair, signal) + pair.trimmer;
  const total = pair.padder === null ? across : (pair.padder * across) / (pair.padder + across);
  return 1 / (2 * Math.PI * Math.sqrt(pair.paddedCoil * total));
}

/** By how much the two are further apart than the intermediate frequency, Hz. */
export function trackingError(pair: PaddedPair, signal: number): number {
  return paddedFrequency(pair, signal) - plainFrequency(pair, signal) - pair.intermediate;
}

/** Refuses points that can't be set. @throws KernelError naming the point and what would work. */
export function checkPoints(conversion: Conversion, points: readonly number[]): void {
  const { intermediate, side } = conversion;
  if (!(intermediate > 0)) {
    throw new KernelError(
      'out-of-bounds',
      'intermediate',
      intermediate,
      `Intermediate frequency: ${hertz(intermediate)} is out of range; give more than 0`,
    );
  }
  points.forEach((point, i) => {
    const least = i > 0 ? points[i - 1]! : side === 'below' ? intermediate : 0;
    if (point > least) return;
    const why =
      i > 0
        ? `is not above the point before it; give more than ${hertz(least)}`
        : side === 'below'
          ? `is not above the intermediate frequency, so that no oscillator can work below it; give more than ${hertz(least)}, or put the oscillator above`
          : 'is out of range; give more than 0';
    throw new KernelError(
      'out-of-bounds',
      `points.${i}`,
      point,
      `Point ${i + 1}: ${hertz(point)} ${why}`,
    );
  });
}

/**
 * Padder, trimmer and coil with which the error is nothing at three signal frequencies.
 * @param points Hz, rising
 */
export function threePoints(
  conversion: Conversion,
  points: readonly [number, number, number],
): PaddedPair {
  checkPoints(conversion, points);
  const { intermediate: F, plainCoil } = conversion;
  const [f1, f2, f3] = points.map((point) => plainFrequency(conversion, point)) as [
    number,
    number,
    number,
  ];
  const a = f1 + f2 + f3;
  const b2 = f1 * f2 + f1 * f3 + f2 * f3;
  const c3 = f1 * f2 * f3;
  const d = a + 2 * F;
  const l2 = (b2 * d - c3) / (2 * F);
  const m2 = l2 + F * F + a * d - b2;
  const n2 = (c3 * d + F * F * l2) / m2;
  const K = 1 / (4 * Math.PI ** 2 * plainCoil);
  const padder = K * (1 / n2 - 1 / l2);
  const trimmer = K / l2;
  const ratio = (l2 / m2) * ((padder + trimmer) / padder);
  return { ...conversion, padder, trimmer, paddedCoil: ratio * plainCoil };
}

/**
 * Trimmer and coil with which the error is nothing at two signal frequencies, the padder as it is.
 * @param padder F, or null for none
 * @param points Hz, rising
 */
export function twoPoints(
  conversion: Conversion,
  padder: number | null,
  points: readonly [number, number],
): PaddedPair {
  checkPoints(conversion, points);
  const { intermediate } = conversion;
  const [low, high] = points.map((point) => plainCapacitance(conversion, point)) as [
    number,
    number,
  ];
  const [fLow, fHigh] = points.map(
    (point) => plainFrequency(conversion, point) + intermediate,
  ) as [number, number];
  // The capacitances of the padded circuit go as (fHigh/fLow)².
  const over = (fHigh / fLow) ** 2 - 1;
  const swing = low - high;
  let across = swing / over;
  if (padder !== null) {
    // x² + (swing + padder)·x − swing·padder/over = 0, x what lies across the section at the high point.
    const half = (swing + padder) / 2;
    across =
      (swing * padder) / over / (half + Math.sqrt(half * half + (swing * padder) / over));
  }
  const total = padder === null ? across : (padder * across) / (padder + across);
  return {
    ...conversion,
    padder,
    trimmer: across - high,
    paddedCoil: 1 / ((2 * Math.PI * fHigh) ** 2 * total),
  };
}
