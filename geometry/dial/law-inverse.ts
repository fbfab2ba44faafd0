/** From a value on the dial to the shaft angle at which the finished plates have it. */

import type { SectionResult } from '../derived';
import { DialError } from './settings';
import { dialUnit, dialValue, type DialQuantity } from './quantity';

export interface LawInverse {
  /** In the dial's unit. */
  readonly low: number;
  readonly high: number;
  readonly unit: string;
  /** From what is written on the dial to Hz, m or F. */
  readonly scale: number;
  /** Shaft angle from the open stop, rad, for what is written on the dial. */
  readonly angleAt: (written: number) => number;
}

/**
 * The finished law the other way round. Between its samples the dial's own quantity is taken as
 * straight, which it nearly is where it follows its law.
 * @throws DialError without a coil, or where one value stands at several angles
 */
export function lawInverse(
  { law, inductance }: Pick<SectionResult, 'law' | 'inductance'>,
  quantity: DialQuantity,
): LawInverse {
  if (inductance === null && quantity !== 'capacitance') {
    throw new DialError(
      'Frequency and wavelength need a coil: give the range as band and coil, or mark capacitance.',
    );
  }
  const inside = law.angle.flatMap((angle, i) =>
    angle >= law.from - 1e-12 && angle <= law.to + 1e-12 ? [i] : [],
  );
  const angles = inside.map((i) => law.angle[i]!);
  const values = inside.map((i) => dialValue(law.achieved[i]!, quantity, inductance ?? 1));
  const rising = quantity === 'frequency' ? -1 : 1;
  for (let i = 1; i < values.length; i++) {
    if (!(rising * (values[i]! - values[i - 1]!) > 0)) {
      const degrees = ((angles[i]! * 180) / Math.PI).toFixed(1);
      throw new DialError(
        `At ${degrees}° the capacitance does not rise, so one value would stand at several marks: change the law until it rises all the way.`,
      );
    }
  }
  const { scale, unit } = dialUnit(quantity, Math.max(values[0]!, values.at(-1)!));
  const written = values.map((value) => value * scale);

  const angleAt = (value: number): number => {
    let [before, after] = [0, written.length - 1];
    while (after - before > 1) {
      const between = (before + after) >> 1;
      if (rising * (written[between]! - value) <= 0) before = between;
      else after = between;
    }
    const [a, b] = [written[before]!, written[after]!];
    return angles[before]! + ((value - a) / (b - a)) * (angles[after]! - angles[before]!);
  };
  return {
    low: Math.min(written[0]!, written.at(-1)!),
    high: Math.max(written[0]!, written.at(-1)!),
    unit,
    scale,
    angleAt,
  };
}
