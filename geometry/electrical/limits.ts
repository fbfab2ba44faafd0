/** What a gap is held to: the limits side by side, the least of them, and the gap that meets it. */

import type { Design, Section } from '../design';
import {
  paschenVoltage,
  practiceVoltage,
  RADIO_FREQUENCY,
  RADIO_FREQUENCY_SHARE,
} from './breakdown';
import { clearanceVoltage } from './clearance';
import { airPath } from './gap';

/** All in V, peak, across the air of one gap. None is a rating. */
export interface GapLimits {
  /** Common practice with rounded edges. */
  readonly practice: number;
  /** Clearance table, inhomogeneous field; null where the table says nothing. */
  readonly squared: number | null;
  /** Smooth parallel plates break down, at radio frequency if the design works there. */
  readonly breakdown: number;
  readonly least: number;
}

/** Does the section work at radio frequency, by its working frequency or its band? */
export function worksAtRadio({ workingFrequency, targetKind, bandHigh }: Section): boolean {
  const frequency = workingFrequency ?? (targetKind === 'band' ? bandHigh : 0);
  return frequency > RADIO_FREQUENCY;
}

/** @param length mm of air, above 0 @param altitude mm above sea level */
export function gapLimits(length: number, altitude: number, radio: boolean): GapLimits {
  const practice = practiceVoltage(length, altitude);
  const squared = clearanceVoltage(length, 'inhomogeneous', altitude);
  const breakdown = paschenVoltage(length, altitude) * (radio ? RADIO_FREQUENCY_SHARE : 1);
  return {
    practice,
    squared,
    breakdown,
    least: Math.min(practice, squared ?? practice, breakdown),
  };
}

/** Step by which a larger gap is looked for, and how many of them: up to some 140 times. */
const STEP = 1.02;
const STEPS = 250;

/** Air gap (mm, to 2 %) whose least limit takes the working voltage; null if none does. */
export function gapThatHolds(design: Design, section: Section): number | null {
  const radio = worksAtRadio(section);
  for (let step = 0; step <= STEPS; step++) {
    const airGap = section.airGap * STEP ** step;
    const { length, share } = airPath(design, { ...section, airGap });
    const { least } = gapLimits(length, design.altitude, radio);
    if (section.workingVoltage * share <= least) return airGap;
  }
  return null;
}
