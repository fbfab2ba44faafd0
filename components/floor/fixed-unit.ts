import { writeQuantity } from '@/geometry/quantity';

const perKernelUnit: Readonly<Record<string, number>> = {
  pF: 1e12,
  nF: 1e9,
  µF: 1e6,
  Hz: 1,
  kHz: 1e-3,
  MHz: 1e-6,
  GHz: 1e-9,
};

/** One unit and one number of decimals for a whole read-out, axis or column, so that digits stand still. */
export interface FixedUnit {
  readonly unit: string;
  /** From the kernel's unit to this one. */
  scale(value: number): number;
  /** The number alone, with the decimals that the largest value needs for four digits. */
  write(value: number): string;
}

/** The unit in which the kernel would write the largest value. */
export function fixedUnit(largest: number, quantity: 'capacitance' | 'frequency'): FixedUnit {
  const { unit } = writeQuantity(largest, quantity);
  const factor = perKernelUnit[unit];
  if (factor === undefined) throw new RangeError(`invalid unit for a read-out: ${unit}`);
  const digits = Math.floor(Math.log10(Math.abs(largest * factor) || 1)) + 1;
  const decimals = Math.min(4, Math.max(0, 4 - digits));
  return {
    unit,
    scale: (value) => value * factor,
    write: (value) => (value * factor).toFixed(decimals),
  };
}
