/** How far a finished oscillator section is off the intermediate frequency, from its outlines. */

import type { Derived } from '../derived';
import { resonantFrequency } from '../resonance';
import { oscillatorFrequency } from './tracked-law';

/** One shaft angle of the law. */
export interface TrackedPlace {
  /** rad from the open stop. */
  readonly angle: number;
  /** To what the finished plates tune both circuits, Hz. */
  readonly signal: number;
  readonly oscillator: number;
  /** By how much the oscillator lies higher than it should for this signal, Hz. */
  readonly error: number;
}

export interface Tracking {
  /** Of the oscillator's section. */
  readonly section: number;
  readonly places: readonly TrackedPlace[];
  readonly worst: TrackedPlace;
}

/**
 * Tracking over the law of one oscillator section with section 1, both as their finished outlines
 * are in the field model, each with the trimmer that sets it right where the law begins.
 * @returns null where the section follows nothing
 */
export function trackingOf(derived: Derived, index: number): Tracking | null {
  const section = derived.design.sections[index];
  const [signal] = derived.sections;
  const oscillator = derived.sections[index];
  if (section?.law !== 'tracked' || !signal || !oscillator) return null;
  const [signalCoil, coil] = [signal.inductance, oscillator.inductance];
  if (signalCoil === null || coil === null) return null;
  const places = signal.law.angle.flatMap((angle, i) => {
    if (signal.law.target[i] === null) return [];
    const tuned = resonantFrequency(signal.law.achieved[i]!, signalCoil);
    const at = resonantFrequency(oscillator.law.achieved[i]!, coil);
    const error = at - oscillatorFrequency(section, tuned);
    return [{ angle, signal: tuned, oscillator: at, error }];
  });
  const worst = places.reduce((most, place) =>
    Math.abs(place.error) > Math.abs(most.error) ? place : most,
  );
  return { section: index, places, worst };
}
