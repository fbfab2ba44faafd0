/** Back-check: the law that the finished outlines really have. */

import type { LawCheck, Plate } from './derived';
import type { Law } from './law';
import { overlapAt } from './overlap';

export interface LawCheckInput {
  readonly law: Law;
  /** Total capacitance open and meshed, F. */
  readonly totalMin: number;
  readonly totalMax: number;
  readonly rotor: Pick<Plate, 'outside'>;
  readonly stator: Pick<Plate, 'outside'>;
  /** rad */
  readonly travel: number;
  /** ε·n, F/mm. */
  readonly permittivityGaps: number;
  /** mm */
  readonly airGap: number;
  readonly cutoutRadius: number;
  readonly rotorEdge: number;
  readonly statorEdge: number;
  /** Intervals over the travel. */
  readonly steps: number;
}

/**
 * C(θ) = Cmin + ε·n·[A/g + Fr·(rotor edge over the stator) + Fs·(cut-out over the rotor)], with
 * area and lengths measured on the overlap of the cut contours.
 *
 * Left out: radial edges (which matter at the ends of the travel), the two end faces of the
 * stack, insulators, frame and posts. The open capacitance is taken as the target's: plates and
 * trimmer have to be brought to it.
 */
export function checkLaw(input: LawCheckInput): LawCheck {
  const { law, travel, steps, totalMin, totalMax } = input;
  const angle = Array.from({ length: steps + 1 }, (_, i) => (travel * i) / steps);
  const overlaps = overlapAt(input.rotor, input.stator, angle, input.cutoutRadius);
  const target = angle.map((_, i) => law.total(i / steps));
  const achieved = overlaps.map(
    ({ area, rotorEdge, cutoutEdge }) =>
      totalMin +
      input.permittivityGaps *
        (area / input.airGap + input.rotorEdge * rotorEdge + input.statorEdge * cutoutEdge),
  );
  const error = achieved.map((value, i) => value - target[i]!);
  let worst = 0;
  error.forEach((value, i) => {
    if (Math.abs(value) > Math.abs(error[worst]!)) worst = i;
  });
  return {
    angle,
    target,
    achieved,
    error,
    largestError: {
      fraction: Math.abs(error[worst]!) / (totalMax - totalMin),
      capacitance: error[worst]!,
      angle: angle[worst]!,
    },
  };
}
