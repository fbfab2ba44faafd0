import { gradedLine, type Stop } from './grading';
import { part } from './plan-mesh';
import type { Fineness } from './polar-plan';
import type { Levels } from './stack-field';
import { cellHeight, type StackShape } from './stack-shape';

const sameHeight = 1e-9;

/** Half a period of an endless stack: rotor midplane to stator midplane, both mirrors. */
export function cellLevels(shape: StackShape, fine: Fineness): Levels {
  const rotorFace = shape.rotorThickness / 2;
  const top = cellHeight(shape);
  const statorFace = top - shape.statorThickness / 2;
  const step = fine.step * shape.gap;
  const stops: Stop[] = [
    { at: 0, step: Infinity },
    { at: rotorFace, step },
    { at: statorFace, step },
    { at: top, step: Infinity },
  ];
  const z = gradedLine(stops, {
    growth: fine.growth,
    most: Infinity,
    refinement: fine.refinement,
  });
  const mask = Uint8Array.from(
    z,
    (height) =>
      part.shaft |
      (height <= rotorFace + sameHeight ? part.rotor : 0) |
      (height >= statorFace - sameHeight ? part.stator : 0),
  );
  return { z, mask };
}
