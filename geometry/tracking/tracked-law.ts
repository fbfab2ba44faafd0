/**
 * The oscillator section of a superheterodyne whose plates are shaped so that its circuit stays
 * the intermediate frequency away from section 1's at every angle, without a padder:
 * Co = 1/(4π²·Lo·(f ± F)²) where the signal's section has Cs = 1/(4π²·L·f²).
 */

import type { Section } from '../design';
import type { Law } from '../law';
import { resonantCapacitance, resonantFrequency } from '../resonance';

/** The section that is followed: its total range, F, and its coil, H. */
export interface SignalRange {
  readonly totalMin: number;
  readonly totalMax: number;
  readonly inductance: number;
}

/** What an oscillator section needs of its parameters. */
export type Oscillator = Pick<
  Section,
  'intermediateFrequency' | 'oscillatorSide' | 'oscillatorCoil' | 'oscillatorStray'
>;

/** Where the oscillator works for a signal, Hz. */
export function oscillatorFrequency(
  {
    intermediateFrequency,
    oscillatorSide,
  }: Pick<Oscillator, 'intermediateFrequency' | 'oscillatorSide'>,
  signal: number,
): number {
  return oscillatorSide === 'above'
    ? signal + intermediateFrequency
    : signal - intermediateFrequency;
}

/** The band of the signal, Hz. */
export function signalBand({ totalMin, totalMax, inductance }: SignalRange): {
  readonly low: number;
  readonly high: number;
} {
  return {
    low: resonantFrequency(totalMax, inductance),
    high: resonantFrequency(totalMin, inductance),
  };
}

/**
 * The coil of the oscillator, H: as given, or that with which its section's own capacitance begins
 * where the signal's does, so that both sections have the same room for trimmer and open plates.
 * @param signalStray stray of the signal's circuit, F
 */
export function oscillatorCoilOf(
  oscillator: Oscillator,
  signal: SignalRange,
  signalStray: number,
): number {
  if (oscillator.oscillatorCoil !== null) return oscillator.oscillatorCoil;
  const high = oscillatorFrequency(oscillator, signalBand(signal).high);
  const total = signal.totalMin - signalStray + oscillator.oscillatorStray;
  return 1 / ((2 * Math.PI * high) ** 2 * total);
}

/** The oscillator section's total capacitance over the law of the signal's section. */
export function trackedLaw(
  oscillator: Oscillator,
  signal: SignalRange,
  law: Law,
  coil: number,
): Law {
  const at = (x: number) => {
    const signalTotal = law.total(x);
    const tuned = resonantFrequency(signalTotal, signal.inductance);
    const wanted = oscillatorFrequency(oscillator, tuned);
    return { signalTotal, tuned, wanted, total: resonantCapacitance(wanted, coil) };
  };
  return {
    total: (x) => at(x).total,
    // df/f is −dC/2C in both circuits, and both frequencies change alike.
    slope: (x) => {
      const { signalTotal, tuned, wanted, total } = at(x);
      return ((total * tuned) / wanted / signalTotal) * law.slope(x);
    },
  };
}
