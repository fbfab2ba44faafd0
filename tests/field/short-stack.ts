import { gradedLine, type Stop } from './grading';
import { part } from './plan-mesh';
import type { Fineness } from './polar-plan';
import type { Levels } from './stack-field';
import { outerRadius, type StackShape } from './stack-shape';

const sameHeight = 1e-9;

/**
 * The upper half of a stack of three rotor and four stator plates, from the middle rotor's
 * midplane, which is a mirror, past the open end face to a box. The shaft and the posts end with
 * the outermost stator's outer face.
 */
export function shortStackLevels(shape: StackShape, fine: Fineness, boxHeight: number): Levels {
  const { gap, rotorThickness, statorThickness } = shape;
  const step = fine.step * gap;
  // Faces from the mirror outwards: half a rotor, stator, rotor, stator.
  const plates = [
    { metal: part.rotor, thickness: rotorThickness / 2 },
    { metal: part.stator, thickness: statorThickness },
    { metal: part.rotor, thickness: rotorThickness },
    { metal: part.stator, thickness: statorThickness },
  ];
  const spans: { metal: number; from: number; to: number }[] = [];
  let height = 0;
  for (const { metal, thickness } of plates) {
    spans.push({ metal, from: height, to: height + thickness });
    height += thickness + gap;
  }
  const end = height - gap;
  const stops: Stop[] = [
    { at: 0, step: Infinity },
    ...spans
      .flatMap(({ from, to }) => [from, to].filter((at) => at > 0))
      .map((at) => ({ at, step })),
    { at: end + boxHeight * outerRadius(shape), step: Infinity },
  ];
  const z = gradedLine(stops, {
    growth: fine.growth,
    most: Infinity,
    refinement: fine.refinement,
  });
  const mask = Uint8Array.from(z, (at) => {
    let metal = at <= end + sameHeight ? part.shaft | part.post : 0;
    for (const span of spans) {
      if (at >= span.from - sameHeight && at <= span.to + sameHeight) metal |= span.metal;
    }
    return metal;
  });
  return { z, mask };
}
