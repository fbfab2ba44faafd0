import { pressureAt } from './atmosphere';

/**
 * Breakdown of air between parallel plates by Paschen's law,
 * V = B·p·d / (ln(A·p·d) − ln ln(1 + 1/γ)), A = 112.50 /(kPa·cm), B = 2737.5 V/(kPa·cm),
 * γ = 0.01. Published; polished, parallel, clean faces, direct voltage.
 *
 * @param gap mm, from about 0.05 upwards (right of the curve's minimum)
 * @param altitude mm above sea level
 * @returns peak voltage, V
 */
export function paschenVoltage(gap: number, altitude = 0): number {
  const pd = (pressureAt(altitude) * gap) / 10;
  return (2737.5 * pd) / (Math.log(112.5 * pd) - Math.log(Math.log(1 + 1 / 0.01)));
}

/**
 * The cautious working figure for an air gap between plates with rounded edges: 1 kV peak for
 * each millimetre. Common practice, no source. Square, burred or dusty edges hold less.
 *
 * @param gap mm
 * @returns peak voltage, V
 */
export function practiceVoltage(gap: number): number {
  return 1000 * gap;
}

/**
 * At radio frequency air can break down at about four fifths of what it holds at 50 Hz. Common
 * practice, no source.
 */
export const RADIO_FREQUENCY_SHARE = 0.8;
