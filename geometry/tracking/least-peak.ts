/**
 * The points at which equal sections are made to track so that the largest error over the band is
 * the least: between the ends and three points the error then has four extremes of one size and
 * turning sign (P. L. Chebyshev's alternation).
 */

import {
  errorCurve,
  extremesOf,
  peakOf,
  zerosOf,
  type Band,
  type ErrorPoint,
} from './error-curve';
import { settingWith } from './circuit-setting';
import {
  checkPoints,
  plainCapacitance,
  plainFrequency,
  threePoints,
  trackingError,
  type Conversion,
  type PaddedPair,
} from './padded-pair';

/** Newton steps, and by how much of the band its derivatives are differenced. */
const STEPS = 60;
const NUDGE = 1e-6;

/** Extremes are of one size when they differ by less than this share. */
const EVEN = 1e-9;

export interface Placement {
  readonly pair: PaddedPair;
  /** Signal frequencies at which there is no error, Hz. */
  readonly points: readonly number[];
  readonly peak: ErrorPoint;
}

/** Zeros of Chebyshev's polynomial over the band, Hz, rising. */
export function chebyshevPoints({ low, high }: Band, count: number): number[] {
  return Array.from(
    { length: count },
    (_, i) => (low + high) / 2 - ((high - low) / 2) * Math.cos(((i + 0.5) * Math.PI) / count),
  );
}

/** Solves A·x = b for a few unknowns, with pivots. */
function solve(matrix: number[][], right: number[]): number[] {
  const n = right.length;
  const rows = matrix.map((row, i) => [...row, right[i]!]);
  for (let i = 0; i < n; i++) {
    let pivot = i;
    for (let k = i + 1; k < n; k++) {
      if (Math.abs(rows[k]![i]!) > Math.abs(rows[pivot]![i]!)) pivot = k;
    }
    [rows[i], rows[pivot]] = [rows[pivot]!, rows[i]!];
    for (let k = 0; k < n; k++) {
      if (k === i) continue;
      const factor = rows[k]![i]! / rows[i]![i]!;
      for (let j = i; j <= n; j++) rows[k]![j]! -= factor * rows[i]![j]!;
    }
  }
  return rows.map((row, i) => row[n]! / row[i]!);
}

/** The largest error between one point and the next, ends of the band included. */
function lobes(pair: PaddedPair, band: Band, points: readonly number[]): number[] {
  const errorAt = (frequency: number): number => trackingError(pair, frequency);
  const extremes = extremesOf(errorAt, band);
  return [...points, Infinity].map((until, i) => {
    const from = i === 0 ? -Infinity : points[i - 1]!;
    return extremes
      .filter(({ frequency }) => frequency >= from && frequency <= until)
      .reduce((worst, { error }) => (Math.abs(error) > Math.abs(worst) ? error : worst), 0);
  });
}

/** Moves the points until the lobes between them are of one size. */
function evenOut(
  band: Band,
  start: readonly number[],
  pairOf: (points: readonly number[]) => PaddedPair,
): Placement {
  const width = band.high - band.low;
  let points = [...start];
  const unevenness = (at: readonly number[]): number[] => {
    const sizes = lobes(pairOf(at), band, at).map(Math.abs);
    return sizes.slice(1).map((size, i) => Math.log(size / sizes[i]!));
  };
  const fits = (at: readonly number[]): boolean =>
    [band.low, ...at, band.high].every((value, i, all) => i === 0 || value > all[i - 1]!);
  let uneven = unevenness(points);
  const size = (of: readonly number[]): number => Math.max(...of.map(Math.abs));
  for (let step = 0; step < STEPS && size(uneven) > EVEN; step++) {
    const columns = points.map((_, k) => {
      const nudged = points.map((point, i) => (i === k ? point + NUDGE * width : point));
      return unevenness(nudged).map((value, i) => (value - uneven[i]!) / (NUDGE * width));
    });
    const jacobian = uneven.map((_, i) => columns.map((column) => column[i]!));
    const move = solve(
      jacobian,
      uneven.map((value) => -value),
    );
    let share = 1;
    for (; share > 1e-6; share /= 2) {
      const tried = points.map((point, i) => point + share * move[i]!);
      if (!fits(tried)) continue;
      const after = unevenness(tried);
      if (size(after) < size(uneven)) {
        [points, uneven] = [tried, after];
        break;
      }
    }
    if (share <= 1e-6) break;
  }
  return placed(pairOf(points), points, band);
}

/** A pair with its points and its largest error over the band. */
export function placed(pair: PaddedPair, points: readonly number[], band: Band): Placement {
  return { pair, points, peak: peakOf((at) => trackingError(pair, at), band) };
}

/** The three points of least peak error over a band, padder, trimmer and coil free. */
export function leastPeak(conversion: Conversion, band: Band): Placement {
  checkPoints(conversion, [band.low, band.high]);
  return evenOut(band, chebyshevPoints(band, 3), (points) =>
    threePoints(conversion, points as [number, number, number]),
  );
}

/** Looks over the band while a setting is sought. */
const LOOKS = 120;

/**
 * The setting of trimmer and coil of least peak error over a band, for a padder as it is.
 * @param padder F, or null for none
 */
export function leastPeakWith(
  conversion: Conversion,
  padder: number | null,
  band: Band,
): Placement {
  checkPoints(conversion, [band.low, band.high]);
  const looks = errorCurve((at) => at, band, LOOKS).map(({ frequency }) => frequency);
  const { intermediate } = conversion;
  const setting = settingWith(
    {
      across: looks.map((at) => plainCapacitance(conversion, at)),
      wanted: looks.map((at) => plainFrequency(conversion, at) + intermediate),
    },
    padder,
  );
  const pair = { ...conversion, padder, trimmer: setting.trimmer, paddedCoil: setting.coil };
  return placed(
    pair,
    zerosOf((at) => trackingError(pair, at), band),
    band,
  );
}
