/** Back-check: the capacitance that the finished outlines really have. */

import { bladeRadius, type Blade } from './blade';
import type { LawCheck, LawError, Plate, Turn } from './derived';
import { stackCapacitance, type SectionEdges } from './field/cell-field';
import type { PlanShare } from './field/plan-share';
import type { EdgePlates } from './field/radial-edges';
import type { Law } from './law';
import { overlapAt } from './overlap';

export interface LawCheckInput {
  readonly law: Law;
  readonly turn: Turn;
  /** Total capacitance at the law's beginning and end, F. */
  readonly totalMin: number;
  readonly totalMax: number;
  /** Stray and frame, F: what is there whatever the plates do. */
  readonly fixed: number;
  readonly rotor: Pick<Plate, 'outside'>;
  readonly stator: Pick<Plate, 'outside'>;
  /** The blade as read from the finished rotor. */
  readonly blade: Blade;
  /** F/mm. */
  readonly permittivity: number;
  readonly gaps: number;
  readonly edges: SectionEdges;
  readonly plates: EdgePlates;
  /** Without one, the edges alone count. */
  readonly share: PlanShare | null;
  /** Allowance for insulators and frame, F: all that the second stator has besides its plates. */
  readonly frame: number;
  /** The second stator of a rotor that passes on. */
  readonly farSide: {
    readonly plates: EdgePlates;
    readonly share: PlanShare | null;
    readonly meshAngle: (meshAngle: number) => number;
  } | null;
}

export interface CheckedLaw {
  readonly law: LawCheck;
  readonly platesOpen: number;
  readonly platesAtLaw: number;
  readonly trimmer: number;
}

/** Intervals over the law, and the longest step in the rests, rad. */
const LAW_STEPS = 80;
const REST_STEP = (3 * Math.PI) / 180;

function anglesOver({ travel, lawFrom, lawTo }: Turn): number[] {
  const rest = (from: number, to: number): number[] => {
    const steps = Math.ceil((to - from) / REST_STEP - 1e-9);
    return Array.from({ length: steps }, (_, i) => from + ((to - from) * i) / steps);
  };
  const law = Array.from(
    { length: LAW_STEPS },
    (_, i) => lawFrom + ((lawTo - lawFrom) * i) / LAW_STEPS,
  );
  return [...rest(0, lawFrom), ...law, ...rest(lawTo, travel), travel];
}

function worst(
  error: readonly (number | null)[],
  angle: readonly number[],
  range: number,
  [from, to]: readonly [number, number],
): LawError {
  let at = -1;
  error.forEach((value, i) => {
    if (value === null || angle[i]! < from || angle[i]! > to) return;
    if (at < 0 || Math.abs(value) > Math.abs(error[at]!)) at = i;
  });
  const capacitance = error[at]!;
  return { fraction: Math.abs(capacitance) / range, capacitance, angle: angle[at]! };
}

/** Capacitance to the second stator, which stands half a turn on, F. */
function toSecondStator(
  { farSide, frame, permittivity, gaps, edges, rotor, stator }: LawCheckInput,
  mesh: readonly number[],
  curves: Parameters<typeof overlapAt>[3],
): number[] | null {
  if (!farSide) return null;
  const { plates, share, meshAngle } = farSide;
  const seen = mesh.map((angle) => angle - Math.PI);
  return overlapAt(rotor, stator, seen, curves).map(
    (overlap, i) =>
      frame +
      permittivity * stackCapacitance(gaps, edges, plates, share, overlap, meshAngle(mesh[i]!)),
  );
}

/**
 * C(θ) of the plates, with area and lengths measured on the overlap of the cut contours and the
 * radial edges taken from them (the composite of geometry/field/cell-field.ts), and the trimmer
 * that brings the beginning of the law to its target. A trimmer only adds: where plates, frame
 * and stray alone have more than the target, the error says so all along.
 */
export function checkLaw(input: LawCheckInput): CheckedLaw {
  const { law, turn, totalMin, totalMax, fixed, edges, plates, share, gaps } = input;
  const perArea = input.permittivity * gaps;
  const angle = anglesOver(turn);
  const mesh = angle.map((shaft) => shaft + turn.meshAtOpen);
  const curves = { cutoutRadius: plates.cutoutRadius, blade: input.blade };
  const overlaps = overlapAt(input.rotor, input.stator, mesh, curves);
  const plateCapacitance = overlaps.map(
    (overlap, i) =>
      input.permittivity * stackCapacitance(gaps, edges, plates, share, overlap, mesh[i]!),
  );
  const begins = angle.indexOf(turn.lawFrom);
  const ends = begins + LAW_STEPS;
  const platesAtLaw = plateCapacitance[begins]!;
  const trimmer = Math.max(0, totalMin - fixed - platesAtLaw);
  const achieved = plateCapacitance.map((value) => value + fixed + trimmer);
  const target = angle.map((_, i) =>
    i < begins || i > ends ? null : law.total((i - begins) / LAW_STEPS),
  );
  const error = target.map((value, i) => (value === null ? null : achieved[i]! - value));
  const span = turn.lawTo - turn.lawFrom;
  const range = totalMax - totalMin;
  const falls = achieved.findIndex(
    (value, i) => i > begins && i <= ends && value <= achieved[i - 1]!,
  );
  return {
    platesOpen: plateCapacitance[0]!,
    platesAtLaw,
    trimmer,
    law: {
      angle,
      target,
      achieved,
      areaOnly: overlaps.map(
        ({ area }) => totalMin + (perArea * (area - overlaps[begins]!.area)) / plates.airGap,
      ),
      error,
      other: toSecondStator(input, mesh, curves),
      from: turn.lawFrom,
      to: turn.lawTo,
      largestError: worst(error, angle, range, [turn.lawFrom, turn.lawTo]),
      largestInner: worst(error, angle, range, [
        turn.lawFrom + 0.05 * span,
        turn.lawTo - 0.05 * span,
      ]),
      fallsAt: falls < 0 ? null : angle[falls - 1]!,
    },
  };
}

/** Plates for the edge model, from a blade and the stator that stands against it. */
export function edgePlates(
  blade: Blade,
  rest: Omit<EdgePlates, 'rotorRadius' | 'rotorSector'>,
): EdgePlates {
  return { ...rest, rotorSector: blade.sector, rotorRadius: (phi) => bladeRadius(blade, phi) };
}
