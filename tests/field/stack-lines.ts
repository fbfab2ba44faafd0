/**
 * The lines of a stack's plan that a polar grid must carry: radial edges as angles at a radius,
 * outlines as radii at an angle. Where there is no metal a line is carried on smoothly.
 *
 * Two lines may cross. The grid then follows the lower and the upper of the two, kept a little
 * apart; what the crossing displaces is far below the grid's own error.
 */
import { inTurn, sameAngle, turn } from './angle';
import { outerRadius, rotorRadius, statorRadius, type StackShape } from './stack-shape';

/** Angles of the four radial edges at radius ρ, as a function of ρ, rad. */
export interface RadialEdges {
  /** Angle of each edge at radius ρ, on one turn from 0. */
  statorFirst: (rho: number) => number;
  statorLast: (rho: number) => number;
  rotorLeading: number;
  rotorTrailing: number;
}

export function radialEdges(shape: StackShape, theta: number): RadialEdges {
  const { travel, edgeOffset, cutoutRadius } = shape;
  const inset = (rho: number, reach: number) =>
    edgeOffset === 0 ? 0 : Math.asin(edgeOffset / Math.min(reach, Math.max(cutoutRadius, rho)));
  return {
    statorFirst: (rho) => inTurn(inset(rho, statorRadius(shape, 0))),
    statorLast: (rho) => inTurn(travel - inset(rho, statorRadius(shape, travel))),
    rotorLeading: inTurn(theta),
    rotorTrailing: inTurn(theta - travel),
  };
}

/** Whether `angle` lies in the sector from `from` over `width`, its ends included. */
export function inSector(angle: number, from: number, width: number): boolean {
  return inTurn(angle - from) <= width + sameAngle;
}

function carriedOn(from: number, to: number, s: number): number {
  return from + (to - from) * s * s * (3 - 2 * s);
}

/** Radius of the rotor's blade at angle ψ, carried on through the sector without blade. */
function bladeRadius(shape: StackShape, theta: number, psi: number): number {
  const { travel } = shape;
  const phi = inTurn(theta - psi);
  if (phi <= travel + sameAngle) return rotorRadius(shape, Math.min(phi, travel));
  return carriedOn(
    rotorRadius(shape, travel),
    rotorRadius(shape, 0),
    (phi - travel) / (turn - travel),
  );
}

/** Radius of the stator's rim at angle ψ, carried on through the sector without stator. */
function rimRadius(shape: StackShape, psi: number): number {
  const { travel } = shape;
  const at = inTurn(psi);
  if (at <= travel + sameAngle) return statorRadius(shape, Math.min(at, travel));
  return carriedOn(
    statorRadius(shape, travel),
    statorRadius(shape, 0),
    (at - travel) / (turn - travel),
  );
}

/** Crossings this near are one grid line, mm. */
const sameRadius = 1e-6;

export interface Outlines {
  blade: number;
  rim: number;
}

/**
 * Blade and rim at each of the rows, at least `apart` from each other. Where they cross between
 * two rows they are as near as that at both, so that nothing is lost where they change sides.
 * Only a carried-on line gives way.
 */
export function outlines(
  shape: StackShape,
  theta: number,
  rows: number[],
  apart: number,
): Outlines[] {
  const at = rows.map((psi) => ({
    blade: bladeRadius(shape, theta, psi),
    rim: rimRadius(shape, psi),
  }));
  const side = at.map(({ blade, rim }) => (rim >= blade ? 1 : -1));
  return at.map(({ blade, rim }, row) => {
    const changes =
      side[row] !== side.at(row - 1) || side[row] !== side[(row + 1) % rows.length];
    if (!changes && Math.abs(rim - blade) >= apart) return { blade, rim };
    const off = apart * side[row]!;
    return inSector(theta - rows[row]!, 0, shape.travel)
      ? { blade, rim: blade + off }
      : { blade: rim - off, rim };
  });
}

/** Radii at which the stator's offset edges cross the rotor's, rising. */
export function edgeCrossings(shape: StackShape, theta: number): number[] {
  const { travel, edgeOffset, cutoutRadius } = shape;
  if (edgeOffset === 0) return [];
  return [theta, theta - travel]
    .flatMap((psi) => [edgeOffset / Math.sin(psi), edgeOffset / Math.sin(travel - psi)])
    .filter((rho) => rho > cutoutRadius && rho < outerRadius(shape))
    .sort((a, b) => a - b)
    .filter((rho, i, all) => i === 0 || rho - all[i - 1]! > sameRadius);
}

/** Angles at which blade and rim cross, where at least one of them is carried on, rising. */
export function outlineCrossings(shape: StackShape, theta: number): number[] {
  const above = (psi: number) => rimRadius(shape, psi) > bladeRadius(shape, theta, psi);
  const found: number[] = [];
  const looks = 720;
  for (let i = 0; i < looks; i += 1) {
    let from = (i * turn) / looks;
    let to = ((i + 1) * turn) / looks;
    const side = above(from);
    if (above(to) === side) continue;
    for (let halving = 0; halving < 40; halving += 1) {
      const mid = (from + to) / 2;
      if (above(mid) === side) from = mid;
      else to = mid;
    }
    found.push((from + to) / 2);
  }
  return found;
}
