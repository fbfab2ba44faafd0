/**
 * Gain of a thick plate edge that lies midway between two large parallel plates.
 * S. B. Cohn, "Problems in strip transmission lines", IRE Trans. MTT-2, 1954.
 *
 * @param tau plate thickness over the distance between the facing plates, 0 ≤ tau < 1
 * @returns capacitance per unit length of edge and per facing plane, over ε. The edge acts as if
 *   it lay this many gaps further out, as long as the facing plates reach several gaps past it.
 */
export function edgeFactor(tau: number): number {
  const y = 1 / (1 - tau);
  // (y − 1)·ln(y² − 1) goes to 0 with y − 1.
  const second = y === 1 ? 0 : (y - 1) * Math.log(y * y - 1);
  return (2 * y * Math.log(y + 1) - second) / Math.PI;
}

/** {@link edgeFactor} of a plate edge with the same air gap on either side. Lengths in mm. */
export function edgeFactorBetween(thickness: number, airGap: number): number {
  return edgeFactor(thickness / (2 * airGap + thickness));
}
