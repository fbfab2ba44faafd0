/**
 * The two open end faces of a stack. Seen from above, the outermost plate and what it leaves
 * visible of the other kind have their own potentials, and the open space between them that of
 * the plan view. The field over this plane holds
 *
 *   C/ε = (1/4π²) ∫ |k|·|û|² d²k
 *
 * The plan view's potential has flux leaving its walls and steps across lines, so that the
 * integral is a double sum over both, with the kernel −ρ/2π and its derivatives, ρ² = r² + a².
 * The radius a stands for the outermost plate's thick edge over the plate below: it gives a long
 * edge what Kirchhoff's thick disc over a plane has (1877; the form for thick plates from
 * memory). Near its end the stack's potential gives way to the open space; how much that takes
 * from the end faces was found by finite differences (`yielding`).
 * The composite is this project's own; tests/field holds it against a short stack.
 */

import { TWO_PI } from '../constants';
import type { EndPlate, Potentials } from './plan-shape';
import type { PlanField } from './plan-view';
import { piecesBeside, sidesOf, type PlanWall, type Polygon } from './plan-walls';

/** A straight piece of a line in plan, with what the potential does there. */
interface Layer {
  /** Its middle, and the way from its beginning to its end, mm. */
  readonly x: number;
  readonly y: number;
  readonly dx: number;
  readonly dy: number;
  /** Flux that leaves the piece. */
  readonly flux: number;
  /** Potential on the left going along the piece, less that on the right. */
  readonly step: number;
}

/** Sum over two pieces, the longer of which is halved until it is shorter than their distance. */
function pairSum(a: Layer, b: Layer, square: number): number {
  return sumOf(
    a.x,
    a.y,
    a.dx,
    a.dy,
    a.flux,
    a.step,
    b.x,
    b.y,
    b.dx,
    b.dy,
    b.flux,
    b.step,
    square,
  );
}

// Bare numbers: this runs some hundred thousand times for each design.
function sumOf(
  ax: number,
  ay: number,
  adx: number,
  ady: number,
  aFlux: number,
  aStep: number,
  bx: number,
  by: number,
  bdx: number,
  bdy: number,
  bFlux: number,
  bStep: number,
  square: number,
): number {
  const x = bx - ax;
  const y = by - ay;
  const rho2 = x * x + y * y + square;
  const a2 = adx * adx + ady * ady;
  const b2 = bdx * bdx + bdy * bdy;
  if (a2 > rho2 && a2 >= b2) {
    const hx = adx / 2;
    const hy = ady / 2;
    const half = aFlux / 2;
    return (
      sumOf(
        ax - hx / 2,
        ay - hy / 2,
        hx,
        hy,
        half,
        aStep,
        bx,
        by,
        bdx,
        bdy,
        bFlux,
        bStep,
        square,
      ) +
      sumOf(
        ax + hx / 2,
        ay + hy / 2,
        hx,
        hy,
        half,
        aStep,
        bx,
        by,
        bdx,
        bdy,
        bFlux,
        bStep,
        square,
      )
    );
  }
  if (b2 > rho2) {
    return sumOf(bx, by, bdx, bdy, bFlux, bStep, ax, ay, adx, ady, aFlux, aStep, square);
  }
  const rho = Math.sqrt(rho2);
  const along = (adx * x + ady * y) * (bdx * x + bdy * y);
  const across = aStep * bStep * (along + square * (adx * bdx + ady * bdy));
  // Normals point to the left.
  const mixed = bFlux * aStep * (adx * y - ady * x) - aFlux * bStep * (bdx * y - bdy * x);
  return across / (rho2 * rho) + mixed / rho - aFlux * bFlux * rho;
}

/** Sum over a piece with itself: exact in its step, nearly so in its flux. */
function selfSum({ dx, dy, flux, step }: Layer, radius: number): number {
  const length = Math.hypot(dx, dy);
  const rho = Math.hypot(length, radius);
  const stepped = 2 * (length * Math.asinh(length / radius) - rho + radius);
  return step * step * stepped - flux * flux * Math.hypot(length / 3, radius);
}

/** C/ε of the field over a plane whose potential has these layers, mm. */
function overPlane(layers: readonly Layer[], radius: number): number {
  const square = radius * radius;
  let sum = 0;
  for (let i = 0; i < layers.length; i++) {
    const own = layers[i]!;
    sum += selfSum(own, radius);
    for (let j = i + 1; j < layers.length; j++) sum += 2 * pairSum(own, layers[j]!, square);
  }
  return sum / TWO_PI;
}

type Line = Pick<PlanWall, 'ax' | 'ay' | 'bx' | 'by'>;

/** @param flux per length */
function layerOf({ ax, ay, bx, by }: Line, flux: number, step: number): Layer {
  const dx = bx - ax;
  const dy = by - ay;
  return {
    x: (ax + bx) / 2,
    y: (ay + by) / 2,
    dx,
    dy,
    flux: flux * Math.hypot(dx, dy),
    step,
  };
}

/**
 * The radius that stands for a thick edge over the plate below, from Kirchhoff's disc over a
 * plane less what the gap's own edge has.
 * @param thickness of the outermost plate, in air gaps
 * @param deepEdge gain of its edge deep over the other plate, per face, air gaps
 * @returns air gaps
 */
export function endEdgeRadius(thickness: number, deepEdge: number): number {
  const over = 2 + thickness;
  const side = (thickness / 2) * Math.log(over / thickness);
  return (2 / (Math.PI * over)) * Math.exp(Math.PI * deepEdge - side);
}

/** Part of the end faces' capacitance that the stack's own open space takes by giving way. */
function yielding(heightOverRadius: number): number {
  return 1 / (5.1 + 4.4 * 2 * Math.tanh(heightOverRadius / 2));
}

/** Steps are spread over this part of the radius where the stack gives way. */
const SPREAD = 1 / 10;

export interface EndSizes {
  /** {@link endEdgeRadius}, mm. */
  readonly edgeRadius: number;
  /** Height of the whole stack, and the radius of a disc of its plan's area, mm. */
  readonly height: number;
  readonly radius: number;
}

/** C/ε of one end face at the mesh angle for which the plan was solved, mm. */
export function endFaceCapacitance(
  outermost: EndPlate,
  rotor: Polygon,
  stators: readonly Polygon[],
  potentials: Potentials,
  walls: readonly PlanWall[],
  { flux }: PlanField,
  { edgeRadius, height, radius }: EndSizes,
): number {
  const layers = walls.map((wall, i) => {
    const visible = wall.kind === 'rotor' ? potentials.rotor : potentials.stators[wall.stator]!;
    return layerOf(wall, flux[i]!, visible - wall.potential + wall.setback * flux[i]!);
  });
  // Steps along edges that lie over the other kind, their squares counted by length.
  let stepped = 0;
  stators.forEach((stator, i) => {
    const [above, below] = outermost === 'rotor' ? [rotor, stator] : [stator, rotor];
    const apart = potentials.rotor - potentials.stators[i]!;
    const step = outermost === 'rotor' ? apart : -apart;
    for (const piece of piecesBeside(sidesOf(above), below, 'inside')) {
      const layer = layerOf(piece, 0, step);
      stepped += step * step * Math.hypot(layer.dx, layer.dy);
      layers.push(layer);
    }
  });
  const whole = overPlane(layers, edgeRadius);
  const sharp = (stepped / Math.PI) * Math.log((SPREAD * radius) / edgeRadius);
  return whole - yielding(height / radius) * (whole - sharp);
}
