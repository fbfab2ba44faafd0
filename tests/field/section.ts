import { gradedLine, type Grading, type Stop } from './grading';
import { gridPlan } from './grid-plan';
import { part, planMesh, type PlanMesh } from './plan-mesh';
import type { Levels } from './stack-field';

/**
 * Plane sections, solved by the same code as the stack: as a plan one level high (x, y), or as a
 * strip of plan of unit width (x) under levels (z).
 */

/** One level: what is left of a stack when nothing changes along the shaft. */
export const oneLevel: Levels = {
  z: [0],
  mask: Uint8Array.of(part.rotor | part.stator | part.shaft | part.post),
};

type Metal = (x: number, y: number) => number;

/** A plan on a Cartesian grid. */
export function flatPlan(x: number[], y: number[], metal: Metal): PlanMesh {
  return planMesh(
    gridPlan({
      metric: 'cartesian',
      rows: y.length,
      columns: x.length,
      closed: false,
      first: (column) => x[column]!,
      second: (_, row) => y[row]!,
      mask: (column, row) => metal(x[column]!, y[row]!),
    }),
  );
}

/** Plates one above the other, without end across the section. */
export interface Section {
  /** Along the section: where an edge is, and the two ends. */
  x: Stop[];
  rotorThickness: number;
  statorThickness: number;
  gap: number;
  rotorReaches: (x: number) => boolean;
  statorReaches: (x: number) => boolean;
}

/** The plan and the levels of a section of unit depth, from midplane to midplane. */
export function sectionField(
  section: Section,
  step: number,
  grading: Grading,
): { plan: PlanMesh; levels: Levels } {
  const x = gradedLine(section.x, grading);
  const rotorFace = section.rotorThickness / 2;
  const statorFace = rotorFace + section.gap;
  const top = statorFace + section.statorThickness / 2;
  const z = gradedLine(
    [
      { at: 0, step: Infinity },
      { at: rotorFace, step },
      // A stator of no thickness ends the section.
      ...(section.statorThickness > 0 ? [{ at: statorFace, step }] : []),
      { at: top, step: Infinity },
    ],
    grading,
  );
  const mask = Uint8Array.from(
    z,
    (height) =>
      (height <= rotorFace + 1e-9 ? part.rotor : 0) |
      (height >= statorFace - 1e-9 ? part.stator : 0),
  );
  const plan = flatPlan(
    x,
    [0, 1],
    (at) =>
      (section.rotorReaches(at) ? part.rotor : 0) |
      (section.statorReaches(at) ? part.stator : 0),
  );
  return { plan, levels: { z, mask } };
}
