/**
 * Air pressure at an altitude by the standard atmosphere (ISO 2533:1975; constants from memory):
 * p = 101.325·(1 − 2.25577·10⁻⁵·h)^5.25588 kPa, h in metres up to 11 000.
 *
 * @param altitude mm above sea level
 * @returns kPa
 */
export function pressureAt(altitude: number): number {
  return 101.325 * (1 - 2.25577e-5 * (altitude / 1000)) ** 5.25588;
}
