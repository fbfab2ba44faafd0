/** The same gang on several coils: what each band covers, and how well it tracks there. */

import type { Derived, SectionResult } from '../derived';
import { KernelError } from '../error';
import { formatQuantity } from '../quantity';
import { resonantFrequency } from '../resonance';
import { bestSetting, settingWith, tunedBy, type CircuitSetting } from './circuit-setting';
import type { OscillatorSide } from './padded-pair';

export interface BandCircuits {
  readonly name: string;
  /** H */
  readonly signalCoil: number;
  /** All that lies across section 1 besides its plates, trimmer included, F. */
  readonly signalStray: number;
  /** The same of the oscillator's section, without the trimmer, F. */
  readonly oscillatorStray: number;
  /** Hz */
  readonly intermediate: number;
  readonly side: OscillatorSide;
  /** May the oscillator have a padder? */
  readonly padder: 'free' | 'none';
}

export interface BandResult {
  readonly name: string;
  /** What section 1 tunes over the law, Hz. */
  readonly low: number;
  readonly high: number;
  readonly setting: CircuitSetting;
  /** Hz; the signal falls as the angle, rad, rises. */
  readonly places: readonly {
    readonly angle: number;
    readonly signal: number;
    readonly error: number;
  }[];
}

/** Capacitance of a section's plates with its frame over the law, F, without stray and trimmer. */
function platesOver({ sections }: Derived, index: number): number[] {
  const { law, stray, trimmer } = sections[index]!;
  return law.achieved.flatMap((total, i) =>
    law.target[i] === null ? [] : [total - stray - trimmer],
  );
}

/** What the signal's circuit of a band has over the whole turn, for its dial. */
export function bandScale(
  { sections }: Derived,
  { signalCoil, signalStray }: Pick<BandCircuits, 'signalCoil' | 'signalStray'>,
): Pick<SectionResult, 'law' | 'inductance'> {
  const { law, stray, trimmer } = sections[0]!;
  const achieved = law.achieved.map((total) => total - stray - trimmer + signalStray);
  return { law: { ...law, achieved }, inductance: signalCoil };
}

/**
 * Coverage and tracking of one band with the finished plates of two sections, the oscillator's
 * coil, trimmer and padder at their best.
 * @param oscillator index of the oscillator's section
 * @throws KernelError where the oscillator would have to work at or below nothing
 */
export function bandOf(derived: Derived, oscillator: number, band: BandCircuits): BandResult {
  const { law } = derived.sections[0]!;
  const angles = law.angle.filter((_, i) => law.target[i] !== null);
  const signal = platesOver(derived, 0).map((plates) =>
    resonantFrequency(plates + band.signalStray, band.signalCoil),
  );
  const [low, high] = [Math.min(...signal), Math.max(...signal)];
  const offset = band.side === 'above' ? band.intermediate : -band.intermediate;
  if (low + offset <= 0) {
    throw new KernelError(
      'out-of-bounds',
      'intermediate',
      band.intermediate,
      `Intermediate frequency: ${formatQuantity(band.intermediate, 'frequency', 4)} is not below the band “${band.name}”; give less than ${formatQuantity(low, 'frequency', 4)} or put the oscillator above`,
    );
  }
  const task = {
    across: platesOver(derived, oscillator).map((plates) => plates + band.oscillatorStray),
    wanted: signal.map((frequency) => frequency + offset),
  };
  const setting = band.padder === 'free' ? bestSetting(task) : settingWith(task, null);
  const tuned = tunedBy(task.across, setting);
  return {
    name: band.name,
    low,
    high,
    setting,
    places: angles.map((angle, i) => ({
      angle,
      signal: signal[i]!,
      error: tuned[i]! - task.wanted[i]!,
    })),
  };
}
