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
import type { PlanField } from './plan-view';
import { piecesBeside, sidesOf, type PlanWall, type Polygon } from './plan-walls';

/** A straight piece of a line in plan, with what the potential does there. */
interface Layer {
  readonly x: number;
  readonly y: number;
  /** Half of the piece, as a vector. */
  readonly hx: number;
  readonly hy: number;
  /** Length, mm. */
  readonly length: number;
  /** Flux that leaves the line, per length. */
  readonly flux: number;
  /** Potential on the left going along the piece, less that on the right. */
  readonly step: number;
}

/** Pieces are halved until they are shorter than this times their distance. */
const NEAR = 1;

function pairSum(a: Layer, b: Layer, square: number): number {
  const dx = b.x - a.x;
  const dy = b.y - a.y;
  const rho2 = dx * dx + dy * dy + square;
  const longer = a.length > b.length ? a : b;
  if (longer.length * longer.length > NEAR * NEAR * rho2) {
    const half = { ...longer, hx: longer.hx / 2, hy: longer.hy / 2, length: longer.length / 2 };
    const low = { ...half, x: longer.x - half.hx, y: longer.y - half.hy };
    const high = { ...half, x: longer.x + half.hx, y: longer.y + half.hy };
    return longer === a
      ? pairSum(low, b, square) + pairSum(high, b, square)
      : pairSum(a, low, square) + pairSum(a, high, square);
  }
  const rho = Math.sqrt(rho2);
  const area = a.length * b.length;
  let sum = -a.flux * b.flux * area * rho;
  if (a.step !== 0 || b.step !== 0) {
    // Tangents times length; normals point to the left.
    const ax = 2 * a.hx;
    const ay = 2 * a.hy;
    const bx = 2 * b.hx;
    const by = 2 * b.hy;
    const along = (ax * dx + ay * dy) * (bx * dx + by * dy);
    sum += (a.step * b.step * (along + square * (ax * bx + ay * by))) / (rho2 * rho);
    sum -= (a.flux * a.length * b.step * (bx * dy - by * dx)) / rho;
    sum += (b.flux * b.length * a.step * (ax * dy - ay * dx)) / rho;
  }
  return sum;
}

/** C/ε of the field over a plane whose potential has these layers, mm. */
function overPlane(layers: readonly Layer[], radius: number): number {
  const square = radius * radius;
  let sum = 0;
  for (let i = 0; i < layers.length; i++) {
    sum += pairSum(layers[i]!, layers[i]!, square);
    for (let j = i + 1; j < layers.length; j++)
      sum += 2 * pairSum(layers[i]!, layers[j]!, square);
  }
  return sum / TWO_PI;
}

type Line = Pick<PlanWall, 'ax' | 'ay' | 'bx' | 'by'>;

function layerOf({ ax, ay, bx, by }: Line, flux: number, step: number): Layer {
  const hx = (bx - ax) / 2;
  const hy = (by - ay) / 2;
  return { x: ax + hx, y: ay + hy, hx, hy, length: 2 * Math.hypot(hx, hy), flux, step };
}

/** Which plate lies outermost at an end of the stack. */
export type EndPlate = 'rotor' | 'stator';

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
  stator: Polygon,
  walls: readonly PlanWall[],
  { flux }: PlanField,
  { edgeRadius, height, radius }: EndSizes,
): number {
  const layers = walls.map((wall, i) => {
    const visible = wall.kind === 'rotor' ? 1 : 0;
    return layerOf(wall, flux[i]!, visible - wall.potential + wall.setback * flux[i]!);
  });
  const [above, below] = outermost === 'rotor' ? [rotor, stator] : [stator, rotor];
  const step = outermost === 'rotor' ? 1 : -1;
  let stepped = 0;
  for (const piece of piecesBeside(sidesOf(above), below, 'inside')) {
    const layer = layerOf(piece, 0, step);
    stepped += layer.length;
    layers.push(layer);
  }
  const whole = overPlane(layers, edgeRadius);
  const sharp = (stepped / Math.PI) * Math.log((SPREAD * radius) / edgeRadius);
  return whole - yielding(height / radius) * (whole - sharp);
}
