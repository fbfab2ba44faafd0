export const turn = 2 * Math.PI;
/** Angles this near are one grid line, rad. */
export const sameAngle = 1e-9;

/** The angle's value in [0, one turn). */
export function inTurn(angle: number): number {
  const a = angle - turn * Math.floor(angle / turn);
  return turn - a < sameAngle ? 0 : a;
}
