/** What a dial may show, and the unit that it is written in. */

import { resonantFrequency } from '../resonance';

export type DialQuantity = 'frequency' | 'wavelength' | 'capacitance';

/** Speed of light, m/s (exact by the definition of the metre). */
const LIGHT = 299_792_458;

/** Hz, m or F for a total capacitance. @param inductance H */
export function dialValue(total: number, quantity: DialQuantity, inductance: number): number {
  if (quantity === 'capacitance') return total;
  const frequency = resonantFrequency(total, inductance);
  return quantity === 'frequency' ? frequency : LIGHT / frequency;
}

/** Scale from a value to what is written on the dial, by its largest value. */
export function dialUnit(
  quantity: DialQuantity,
  largest: number,
): { scale: number; unit: string } {
  if (quantity === 'capacitance') return { scale: 1e12, unit: 'pF' };
  if (quantity === 'wavelength') return { scale: 1, unit: 'm' };
  return largest >= 3e6 ? { scale: 1e-6, unit: 'MHz' } : { scale: 1e-3, unit: 'kHz' };
}
