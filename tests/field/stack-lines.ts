/**
 * The lines of a stack's plan that a polar grid must carry: radial edges as angles at a radius,
 * outlines as radii at an angle. Where there is no metal a line is carried on smoothly.
 *
 * Two lines may cross. The grid then follows the lower and the upper of the two, kept a little
 * apart; what the crossing displaces is far below the grid's own error.
 */
import { inTurn, sameAngle, turn } from './angle';
import { rotorRadius, statorRadius, type StackShape } from './stack-shape';

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

/** Blade and rim at angle ψ, at least `apart` from each other; only a carried-on line gives way. */
export function outlines(
  shape: StackShape,
  theta: number,
  psi: number,
  apart: number,
): { blade: number; rim: number } {
  const blade = bladeRadius(shape, theta, psi);
  const rim = rimRadius(shape, psi);
  if (Math.abs(rim - blade) >= apart) return { blade, rim };
  const side = rim >= blade ? apart : -apart;
  return inSector(theta - psi, 0, shape.travel)
    ? { blade, rim: blade + side }
    : { blade: rim - side, rim };
}
