import type { Derived } from '@/geometry';
import { couplingsOf, type Coupling } from '@/geometry/electrical/coupling';
import { balanceOf, type Balance } from '@/geometry/mechanics/balance';
import { alignmentOf, type AlignmentStep } from '@/geometry/tracking/alignment';
import { bandOf, type BandCircuits, type BandResult } from '@/geometry/tracking/bands';
import { errorCurve, type Band, type ErrorPoint } from '@/geometry/tracking/error-curve';
import {
  leastPeak,
  leastPeakWith,
  placed,
  type Placement,
} from '@/geometry/tracking/least-peak';
import {
  threePoints,
  trackingError,
  twoPoints,
  type Conversion,
} from '@/geometry/tracking/padded-pair';
import {
  nearestPreferred,
  preferredSeries,
  type PreferredSeries,
} from '@/geometry/tracking/preferred-values';
import { trimmerRange, type TrimmerRange } from '@/geometry/tracking/trimmer-range';
import { responseOf } from '@/geometry/tolerance/response';
import { stacksByChance } from '@/geometry/tolerance/stacks';
import { startingTolerances } from '@/geometry/tolerance/tolerances';
import { failureOf, type JobMessage } from '@/components/tools/job/messages';

/** A setting of the padded pair with its error over the band. */
export interface PlacedCurve {
  readonly placement: Placement;
  readonly curve: readonly ErrorPoint[];
}

export type PairQuestion =
  | {
      readonly kind: 'padded';
      readonly conversion: Conversion;
      readonly band: Band;
      readonly points: readonly [number, number, number];
    }
  | {
      readonly kind: 'bands';
      readonly derived: Derived;
      readonly oscillator: number;
      readonly bands: readonly BandCircuits[];
    }
  | { readonly kind: 'setting-up'; readonly derived: Derived };

export interface StockPadder {
  /** null: without a padder. */
  readonly series: PreferredSeries | null;
  /** Trimmer and coil at their best over the band. */
  readonly best: Placement;
  /** Trimmer and coil as the first and the last of the given points set them. */
  readonly atTwo: Placement;
}

export interface PaddedAnswer {
  readonly kind: 'padded';
  readonly given: PlacedCurve;
  readonly best: PlacedCurve;
  readonly stock: readonly StockPadder[];
}

export interface SettingUpAnswer {
  readonly kind: 'setting-up';
  readonly steps: readonly AlignmentStep[] | null;
  readonly trimmers: readonly TrimmerRange[];
  readonly balance: Balance;
  readonly couplings: readonly Coupling[];
}

export type PairAnswer =
  | PaddedAnswer
  | { readonly kind: 'bands'; readonly bands: readonly BandResult[] }
  | SettingUpAnswer;

const STACKS = 500;
const SEED = 1;

function padded({
  conversion,
  band,
  points,
}: Extract<PairQuestion, { kind: 'padded' }>): PaddedAnswer {
  const curveOf = (placement: Placement): PlacedCurve => ({
    placement,
    curve: errorCurve((at) => trackingError(placement.pair, at), band, 120),
  });
  const best = leastPeak(conversion, band);
  const names = Object.keys(preferredSeries) as PreferredSeries[];
  const ends = [points[0], points[2]] as const;
  const stock = [...names, null].map((series): StockPadder => {
    const padder = series && nearestPreferred(series, best.pair.padder!);
    return {
      series,
      best: leastPeakWith(conversion, padder, band),
      atTwo: placed(twoPoints(conversion, padder, ends), ends, band),
    };
  });
  return {
    kind: 'padded',
    given: curveOf(placed(threePoints(conversion, points), points, band)),
    best: curveOf(best),
    stock,
  };
}

function settingUp(derived: Derived): SettingUpAnswer {
  const trimmers = derived.sections.map((_, section) => {
    const run = stacksByChance(responseOf(derived, section), startingTolerances, {
      stacks: STACKS,
      seed: SEED,
      limit: 0.01,
    });
    let step = run.next();
    while (!step.done) {
      send({ done: section * STACKS + step.value, of: derived.sections.length * STACKS });
      step = run.next();
    }
    return trimmerRange(derived, section, step.value);
  });
  return {
    kind: 'setting-up',
    steps: alignmentOf(derived),
    trimmers,
    balance: balanceOf(derived),
    couplings: couplingsOf(derived),
  };
}

const send = (message: JobMessage<PairAnswer>): void => postMessage(message);

function answerTo(question: PairQuestion): PairAnswer {
  if (question.kind === 'padded') return padded(question);
  if (question.kind === 'setting-up') return settingUp(question.derived);
  const { derived, oscillator, bands } = question;
  return { kind: 'bands', bands: bands.map((band) => bandOf(derived, oscillator, band)) };
}

addEventListener('message', ({ data }: MessageEvent<PairQuestion>) => {
  try {
    send({ answer: answerTo(data) });
  } catch (error) {
    send(failureOf(error));
  }
});
