import { cellLevels } from './cell-levels';
import { extrapolate, type Limit, type Refinements } from './extrapolation';
import { polarPlan, type Fineness } from './polar-plan';
import { stackField } from './stack-field';
import type { StackShape } from './stack-shape';

/** The grids of the reference; each is cut `refinement` times as fine in every direction. */
export function referenceFineness(shape: StackShape, refinement: number): Fineness {
  // Spirals are followed by chords, so they need more rows than arcs, which are exact.
  const spirals = shape.rotor.form !== 'arc' || shape.stator.form !== 'arc';
  return { step: 1 / 8, growth: 0.6, mostAngle: spirals ? 0.2 : 0.4, box: 30, refinement };
}

/** C/ε of half a period at mesh angle θ on one grid, mm. */
export function solveOnGrid(shape: StackShape, theta: number, fine: Fineness): number {
  return stackField(polarPlan(shape, theta, fine), cellLevels(shape, fine)).capacitance;
}

/** C/ε of half a period at mesh angle θ, mm, with what each grid gave. */
export function solveCase(
  shape: StackShape,
  theta: number,
  refinements: Refinements,
): Limit & { onGrids: number[] } {
  const [a, b, c] = refinements;
  const on = (refinement: number) =>
    solveOnGrid(shape, theta, referenceFineness(shape, refinement));
  const onGrids: [number, number, number] = [on(a), on(b), on(c)];
  return { ...extrapolate(refinements, onGrids), onGrids };
}
