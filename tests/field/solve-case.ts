import { cellLevels } from './cell-levels';
import { extrapolate, type Limit } from './extrapolation';
import { polarPlan, type Fineness } from './polar-plan';
import { stackField } from './stack-field';
import type { StackShape } from './stack-shape';

/** The grids of the reference; each is cut `refinement` times as fine in every direction. */
export const referenceFineness: Omit<Fineness, 'refinement'> = {
  step: 1 / 8,
  growth: 0.6,
  mostAngle: 0.4,
  box: 30,
};
export const referenceRefinements = [2, 3, 4] as const;

/** C/ε of half a period at mesh angle θ on one grid, mm. */
export function solveOnGrid(shape: StackShape, theta: number, fine: Fineness): number {
  return stackField(polarPlan(shape, theta, fine), cellLevels(shape, fine)).capacitance;
}

/** C/ε of half a period at mesh angle θ, mm, with what each grid gave. */
export function solveCase(shape: StackShape, theta: number): Limit & { onGrids: number[] } {
  const onGrids = referenceRefinements.map((refinement) =>
    solveOnGrid(shape, theta, { ...referenceFineness, refinement }),
  );
  const limit = extrapolate(referenceRefinements, onGrids as [number, number, number]);
  return { ...limit, onGrids };
}
