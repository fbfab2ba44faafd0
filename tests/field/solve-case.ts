import { cellLevels } from './cell-levels';
import { extrapolate, type Limit, type Refinements } from './extrapolation';
import { polarPlan, type Fineness } from './polar-plan';
import { shortStackLevels } from './short-stack';
import { stackField } from './stack-field';
import type { StackShape } from './stack-shape';

/** The limit, with what each grid gave. */
export interface Solution extends Limit {
  onGrids: number[];
}

/** The grids of the reference; each is cut `refinement` times as fine in every direction. */
export function referenceFineness(shape: StackShape, refinement: number): Fineness {
  // Spirals are followed by chords, so they need more rows than arcs, which are exact.
  const spirals = shape.rotor.form !== 'arc' || shape.stator.form !== 'arc';
  return { step: 1 / 8, growth: 0.6, mostAngle: spirals ? 0.2 : 0.4, box: 30, refinement };
}

function limitOf(refinements: Refinements, on: (refinement: number) => number): Solution {
  const [a, b, c] = refinements;
  const onGrids: [number, number, number] = [on(a), on(b), on(c)];
  return { ...extrapolate(refinements, onGrids), onGrids };
}

/** C/ε of half a period at mesh angle θ on one grid, mm. */
export function solveOnGrid(shape: StackShape, theta: number, fine: Fineness): number {
  return stackField(polarPlan(shape, theta, fine), cellLevels(shape, fine)).capacitance;
}

/** C/ε of half a period at mesh angle θ, mm. */
export function solveCase(
  shape: StackShape,
  theta: number,
  refinements: Refinements,
): Solution {
  return limitOf(refinements, (refinement) =>
    solveOnGrid(shape, theta, referenceFineness(shape, refinement)),
  );
}

/** Inner radius of the plan where the shaft ends, over the shaft's radius. */
const inner = 0.02;
/** Height of the box above a short stack over the plates' largest radius. */
const boxHeight = 10;

/** C/ε of a whole stack of three rotor and four stator plates on one grid, mm. */
export function solveShortOnGrid(shape: StackShape, theta: number, fine: Fineness): number {
  const plan = polarPlan(shape, theta, fine, inner * shape.shaftRadius);
  return 2 * stackField(plan, shortStackLevels(shape, fine, boxHeight)).capacitance;
}

/** C/ε of a whole stack of three rotor and four stator plates at mesh angle θ, mm. */
export function solveShortStack(
  shape: StackShape,
  theta: number,
  refinements: Refinements,
): Solution {
  return limitOf(refinements, (refinement) =>
    solveShortOnGrid(shape, theta, referenceFineness(shape, refinement)),
  );
}
