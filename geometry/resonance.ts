/** A coil with its capacitance. */

/**
 * Capacitance that tunes a coil to a frequency: C = 1/((2πf)²·L).
 * @param frequency Hz
 * @param inductance H
 * @returns F
 */
export function resonantCapacitance(frequency: number, inductance: number): number {
  return 1 / ((2 * Math.PI * frequency) ** 2 * inductance);
}

/**
 * Frequency to which a capacitance tunes a coil.
 * @param capacitance F, the total
 * @param inductance H
 * @returns Hz
 */
export function resonantFrequency(capacitance: number, inductance: number): number {
  return 1 / (2 * Math.PI * Math.sqrt(capacitance * inductance));
}
