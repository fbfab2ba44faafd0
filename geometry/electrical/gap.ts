/** The air path of a gap and the share of the working voltage that it holds. */

import { arrangementOf } from '../arrangement';
import type { Design, Section } from '../design';
import { electricalGap } from '../dielectric';

export interface AirPath {
  /** mm; 0 where a solid disc fills the gap. */
  readonly length: number;
  /** Of the voltage between the terminals. */
  readonly share: number;
}

/**
 * Two sets in series share the voltage; beside a film the air takes more than its part of the
 * way, since the film's field is weaker by its permittivity.
 */
export function airPath(design: Design, section: Section): AirPath {
  const inSeries = arrangementOf(design).share;
  const { dielectric, airGap, filmThickness } = section;
  if (dielectric === 'disc') return { length: 0, share: 0 };
  if (dielectric === 'air') return { length: airGap, share: inSeries };
  const length = airGap - filmThickness;
  return { length, share: (inSeries * length) / electricalGap(section) };
}
