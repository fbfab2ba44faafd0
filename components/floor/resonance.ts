/**
 * Frequency to which a coil and a total capacitance tune, Hz: f = 1 / (2π√(LC)), W. Thomson, "On
 * transient electric currents", Phil. Mag. 5 (1853).
 * @param inductance H, @param capacitance F.
 */
export function resonance(inductance: number, capacitance: number): number {
  return 1 / (2 * Math.PI * Math.sqrt(inductance * capacitance));
}
