/** What is asked of a dial. mm, rad */

import type { DialQuantity } from './quantity';

export interface DialSettings {
  readonly quantity: DialQuantity;
  readonly form: 'round' | 'straight';
  /** What moves with the shaft: a pointer over the scale, or the scale under a fixed line. */
  readonly moves: 'pointer' | 'scale';
  /** Which way it moves while the plates mesh; on a straight scale clockwise is to the right. */
  readonly sense: 'clockwise' | 'anticlockwise';
  /** Outer radius of a round scale. */
  readonly radius: number;
  /** Where the middle of a round scale lies, or where its open stop does. */
  readonly place: 'upper' | 'lower' | 'open';
  /** Bearing of the open stop, clockwise from the top, where `place` is `open`. */
  readonly open: number;
  /** Hole for the shaft; 0 for none. */
  readonly hole: number;
  /** Turns of dial or drum for one turn of the shaft. */
  readonly ratio: number;
  /** Circumference of the drum that moves the cord of a straight scale. */
  readonly drum: number;
  readonly title: string;
}

/** Why a dial can't be, with what would work. */
export class DialError extends Error {
  override readonly name = 'DialError';
}

/** Least and most that may be asked. */
export const dialBounds = {
  radius: [25, 200],
  hole: [0, 100],
  ratio: [0.01, 100],
  drum: [10, 2000],
} as const;

const names = {
  radius: 'Radius',
  hole: 'Hole',
  ratio: 'Turns for one of the shaft',
  drum: 'Drum',
} as const;

/** @throws DialError */
export function checkSettings(settings: DialSettings): void {
  const counts =
    settings.form === 'round' ? (['radius', 'hole'] as const) : (['drum'] as const);
  for (const key of ['ratio', ...counts] as const) {
    const [least, most] = dialBounds[key];
    const value = settings[key];
    const unit = key === 'ratio' ? '' : ' mm';
    if (!(value >= least && value <= most)) {
      throw new DialError(
        `${names[key]}: ${value}${unit} is out of range; give ${least} to ${most}${unit}.`,
      );
    }
  }
  if (!Number.isFinite(settings.open)) {
    throw new DialError('Open stop: not an angle; give one from 0 to 360°.');
  }
}
