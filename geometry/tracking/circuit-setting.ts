/**
 * Coil, trimmer and padder with which a circuit follows the frequencies asked of it, its section's
 * capacitance being what it is: least largest error over all places.
 */

import { resonantFrequency } from '../resonance';

/** Places over the turn, the same in both. */
export interface Task {
  /** What lies across the section there before the trimmer, F. */
  readonly across: readonly number[];
  /** Hz */
  readonly wanted: readonly number[];
}

export interface CircuitSetting {
  /** H */
  readonly coil: number;
  /** F; negative where the circuit has more than it should. */
  readonly trimmer: number;
  /** In series, F, or null for none. */
  readonly padder: number | null;
  /** Largest error to either side, Hz. */
  readonly peak: number;
}

const GOLDEN = (Math.sqrt(5) - 1) / 2;

/** Steps of both searches; each takes 0.618 of the width before. */
const TRIMMER_STEPS = 50;
const PADDER_STEPS = 32;
const SCALE_STEPS = 50;

/** A trimmer is sought so that the least total lies within this factor of where it began. */
const WIDTH = 20;

/** Where a function that falls and then rises is least, by golden section. */
function leastBetween(
  from: number,
  to: number,
  steps: number,
  at: (x: number) => number,
): number {
  let [a, b] = [from, to];
  let left = b - GOLDEN * (b - a);
  let right = a + GOLDEN * (b - a);
  let [atLeft, atRight] = [at(left), at(right)];
  for (let i = 0; i < steps; i++) {
    if (atLeft < atRight) {
      [b, right, atRight] = [right, left, atLeft];
      left = b - GOLDEN * (b - a);
      atLeft = at(left);
    } else {
      [a, left, atLeft] = [left, right, atRight];
      right = a + GOLDEN * (b - a);
      atRight = at(right);
    }
  }
  return (a + b) / 2;
}

const inSeries = (across: number, padder: number | null): number =>
  padder === null ? across : (padder * across) / (padder + across);

/** Frequencies of a circuit at all places, Hz. */
export function tunedBy(
  across: readonly number[],
  { coil, trimmer, padder }: Pick<CircuitSetting, 'coil' | 'trimmer' | 'padder'>,
): number[] {
  return across.map((own) => resonantFrequency(inSeries(own + trimmer, padder), coil));
}

/**
 * The coil only scales the circuit's frequency: the best one makes the largest error to either
 * side alike.
 */
function coilFor({ across, wanted }: Task, trimmer: number, padder: number | null) {
  const tuned = tunedBy(across, { coil: 1, trimmer, padder });
  const ratios = tuned.map((value, i) => wanted[i]! / value);
  let [small, large] = [Math.min(...ratios), Math.max(...ratios)];
  const ends = (scale: number): readonly [most: number, least: number] => {
    let [most, least] = [-Infinity, Infinity];
    for (const [i, value] of tuned.entries()) {
      const error = scale * value - wanted[i]!;
      if (error > most) most = error;
      if (error < least) least = error;
    }
    return [most, least];
  };
  for (let i = 0; i < SCALE_STEPS; i++) {
    const middle = (small + large) / 2;
    const [most, least] = ends(middle);
    if (most + least > 0) large = middle;
    else small = middle;
  }
  const scale = (small + large) / 2;
  return { coil: 1 / scale ** 2, peak: ends(scale)[0] };
}

/** The best coil and trimmer for a padder as it is, F, or for none. */
export function settingWith(task: Task, padder: number | null): CircuitSetting {
  const least = Math.min(...task.across);
  const trimmerAt = (x: number): number => least * (WIDTH ** x - 1);
  const best = leastBetween(
    -1,
    1,
    TRIMMER_STEPS,
    (x) => coilFor(task, trimmerAt(x), padder).peak,
  );
  const trimmer = trimmerAt(best);
  return { ...coilFor(task, trimmer, padder), trimmer, padder };
}

/** The best coil and trimmer, and the padder if one does better than none. */
export function bestSetting(task: Task): CircuitSetting {
  const most = Math.max(...task.across);
  const padderAt = (x: number): number => most * 10 ** x;
  const best = leastBetween(-1, 2, PADDER_STEPS, (x) => settingWith(task, padderAt(x)).peak);
  const padded = settingWith(task, padderAt(best));
  const plain = settingWith(task, null);
  return padded.peak < plain.peak ? padded : plain;
}
