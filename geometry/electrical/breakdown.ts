import { pressureAt } from './atmosphere';

/** Paschen's constants for air: published, A in 1/(kPa·cm), B in V/(kPa·cm); γ = 0.01. */
const A = 112.5;
const B = 2737.5;
const YIELD = Math.log(1 + 1 / 0.01);

/** kPa·cm. Where the curve has its least voltage; smaller gaps are held to that voltage too. */
const LEAST = (Math.E * YIELD) / A;

/**
 * Breakdown of air between parallel plates by Paschen's law,
 * V = B·p·d / (ln(A·p·d) − ln ln(1 + 1/γ)); left of the minimum of the curve, the minimum (some
 * 305 V). Polished, parallel, clean faces, direct voltage.
 *
 * @param gap mm
 * @param altitude mm above sea level
 * @returns peak voltage, V
 */
export function paschenVoltage(gap: number, altitude = 0): number {
  const pd = Math.max((pressureAt(altitude) * gap) / 10, LEAST);
  return (B * pd) / (Math.log(A * pd) - Math.log(YIELD));
}

/**
 * The cautious working figure for an air gap between plates with rounded edges: 1 kV peak for
 * each millimetre at sea level. Common practice, no source. Square, burred or dusty edges hold
 * less. Thinner air: less by as much as Paschen's law gives.
 *
 * @param gap mm
 * @param altitude mm above sea level
 * @returns peak voltage, V
 */
export function practiceVoltage(gap: number, altitude = 0): number {
  return (1000 * gap * paschenVoltage(gap, altitude)) / paschenVoltage(gap);
}

/**
 * At radio frequency air can break down at about four fifths of what it holds at 50 Hz. Common
 * practice, no source.
 */
export const RADIO_FREQUENCY_SHARE = 0.8;

/** Hz. Up to here the clearances of IEC 60664-1 are meant (its scope, from memory). */
export const RADIO_FREQUENCY = 30e3;
