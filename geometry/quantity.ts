import type { Quantity } from './parameters';

/** How a quantity is written for people: scale from kernel unit, unit sign, decimals at most. */
interface Notation {
  readonly unit: string;
  readonly perKernelUnit: number;
}

/** Largest unit first; the first that leaves a value of 1 or more is used. */
const notations: Record<Quantity, readonly Notation[]> = {
  length: [{ unit: 'mm', perKernelUnit: 1 }],
  altitude: [{ unit: 'm', perKernelUnit: 1e-3 }],
  angle: [{ unit: '°', perKernelUnit: 180 / Math.PI }],
  capacitance: [
    { unit: 'µF', perKernelUnit: 1e6 },
    { unit: 'nF', perKernelUnit: 1e9 },
    { unit: 'pF', perKernelUnit: 1e12 },
  ],
  inductance: [
    { unit: 'H', perKernelUnit: 1 },
    { unit: 'mH', perKernelUnit: 1e3 },
    { unit: 'µH', perKernelUnit: 1e6 },
    { unit: 'nH', perKernelUnit: 1e9 },
  ],
  frequency: [
    { unit: 'GHz', perKernelUnit: 1e-9 },
    { unit: 'MHz', perKernelUnit: 1e-6 },
    { unit: 'kHz', perKernelUnit: 1e-3 },
    { unit: 'Hz', perKernelUnit: 1 },
  ],
  voltage: [
    { unit: 'kV', perKernelUnit: 1e-3 },
    { unit: 'V', perKernelUnit: 1 },
  ],
  count: [{ unit: '', perKernelUnit: 1 }],
  ratio: [{ unit: '', perKernelUnit: 1 }],
};

/** Units in which values below 10 of the larger unit are still better read in the smaller. */
const KEEP_SMALLER_BELOW: Partial<Record<string, number>> = { nF: 10, µF: 1, MHz: 10, mH: 1 };

export interface WrittenQuantity {
  readonly number: string;
  readonly unit: string;
}

/**
 * A kernel value as people of the trade write it: `365 pF`, `1600 kHz`, `0.5 mm`, `180 °`.
 * @param significant digits kept; trailing zeros are dropped.
 */
export function writeQuantity(
  value: number,
  quantity: Quantity,
  significant = 6,
): WrittenQuantity {
  const choices = notations[quantity];
  const size = Math.abs(value);
  const chosen =
    choices.find(
      ({ unit, perKernelUnit }) => size * perKernelUnit >= (KEEP_SMALLER_BELOW[unit] ?? 1),
    ) ?? choices[choices.length - 1]!;
  const scaled = value * chosen.perKernelUnit;
  return { number: String(Number(scaled.toPrecision(significant))), unit: chosen.unit };
}

/** {@link writeQuantity} in one string; degrees close up to the number. */
export function formatQuantity(value: number, quantity: Quantity, significant = 6): string {
  const { number, unit } = writeQuantity(value, quantity, significant);
  if (unit === '') return number;
  return unit === '°' ? `${number}°` : `${number} ${unit}`;
}
