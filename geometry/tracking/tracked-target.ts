/** What an oscillator section must reach, from the section that it follows. */

import type { Section } from '../design';
import type { Finding } from '../finding';
import { formatQuantity } from '../quantity';
import { resonantCapacitance } from '../resonance';
import type { Target } from '../target';
import {
  oscillatorCoilOf,
  oscillatorFrequency,
  signalBand,
  type SignalRange,
} from './tracked-law';

const written = (value: number, quantity: 'frequency' | 'inductance' | 'capacitance'): string =>
  formatQuantity(value, quantity, 4);

/** Why a section can't be followed; `section` is the one where it is put right. */
function noLaw(
  section: number,
  label: string,
  change: string,
  parameters: readonly string[],
): Finding {
  const [value, limit] = [0, 1];
  return {
    code: 'own-law',
    severity: 'fail',
    section,
    label,
    value,
    limit,
    quantity: 'count',
    change,
    parameters,
  };
}

/** A section that follows must not be the first one. */
export function followsItself(): Finding {
  const change = 'Section 1 is the one that others follow: give it a law of its own.';
  return noLaw(0, 'A section to follow', change, ['law']);
}

/** While section 1 has no law, whoever follows it has none. */
export function nothingToFollow(index: number): Finding {
  const change = 'Section 1 has no law yet: put it right first.';
  return noLaw(index, 'A section to follow', change, ['law']);
}

/** The signal's section as one that can be followed, or the finding that says why it can't. */
export function followed(signal: Target, index: number): SignalRange | Finding {
  const { totalMin, totalMax, inductance } = signal;
  if (inductance !== null) return { totalMin, totalMax, inductance };
  return noLaw(
    0,
    `A coil for section ${index + 1} to follow`,
    `Section ${index + 1} follows the frequency of section 1: give its range as band and coil.`,
    ['targetKind'],
  );
}

/** The total range of an oscillator section, or the finding that says why there is none. */
export function trackedTarget(
  section: Section,
  index: number,
  signal: SignalRange,
  signalStray: number,
): Target | Finding {
  const { intermediateFrequency, oscillatorStray } = section;
  const { low, high } = signalBand(signal);
  if (oscillatorFrequency(section, low) <= 0) {
    return {
      code: 'tracking',
      severity: 'fail',
      section: index,
      label: 'Intermediate frequency below the band, for an oscillator below',
      value: intermediateFrequency,
      limit: low,
      quantity: 'frequency',
      change: `Take an intermediate frequency under ${written(low, 'frequency')}, where the band begins, or the oscillator above the signal.`,
      parameters: ['oscillatorSide', 'intermediateFrequency'],
    };
  }
  const inductance = oscillatorCoilOf(section, signal, signalStray);
  const highest = oscillatorFrequency(section, high);
  const totalMin = resonantCapacitance(highest, inductance);
  if (oscillatorStray >= totalMin) {
    const coil = 1 / ((2 * Math.PI * highest) ** 2 * oscillatorStray);
    return {
      code: 'range-infeasible',
      severity: 'fail',
      section: index,
      label: 'Oscillator stray below the total at the high end',
      value: oscillatorStray,
      limit: totalMin,
      quantity: 'capacitance',
      change: `The stray alone tunes the oscillator below ${written(highest, 'frequency')}: lower it, or take a coil well under ${written(coil, 'inductance')}.`,
      parameters: ['oscillatorCoil', 'oscillatorStray'],
    };
  }
  return {
    totalMin,
    totalMax: resonantCapacitance(oscillatorFrequency(section, low), inductance),
    stray: oscillatorStray,
    inductance,
  };
}
