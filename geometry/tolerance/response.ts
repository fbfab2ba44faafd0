/**
 * How the capacitance of finished plates answers to small changes. The area term is taken exactly
 * for every gap; what edges, plan view and end faces add is taken as it is, with its slope in the
 * gap (edges alone). Outlines act through the length of their curves over the other plate.
 */

import { arrangementOf } from '../arrangement';
import { EPSILON_0 } from '../constants';
import type { Derived } from '../derived';
import { createEdgeCache, gapCapacitance } from '../field/cell-field';
import { mirrorPath } from '../mirror';
import type { Contour } from '../outline';
import { overlapAt } from '../overlap';
import { bladeOf } from '../rotor';
import { platesOf, settingOf } from '../setting';
import { BLADE_STEPS } from '../solve-blade';

export interface Response {
  /** Shaft angles over the law, rad. */
  readonly angle: readonly number[];
  /** F */
  readonly target: readonly number[];
  readonly nominal: readonly number[];
  /** F·mm: of the overlap's area, to be divided by a gap, summed over gaps. */
  readonly area: readonly number[];
  /** F·mm/rad: the same per angle of all rotor plates. */
  readonly areaPerAngle: readonly number[];
  /** F: per mm of the rotor's outer edge outwards and of the cut-out inwards, over a gap. */
  readonly outline: readonly number[];
  readonly cutout: readonly number[];
  /** F/mm: what all but the area changes for each mm that one gap grows. */
  readonly restPerGap: readonly number[];
  /** mm, as the field sees the gap. */
  readonly gap: number;
  readonly gaps: number;
  readonly rotorPlates: number;
  readonly statorPlates: number;
  readonly packs: number;
  /** Radius to which a tilt at the rim is counted, mm. */
  readonly range: number;
}

/** Shaft angles over the law at which stacks are looked at. */
const LOOKS = 41;

/** Of the gap, for its slope. */
const STEP = 0.02;

function ccw(contour: Contour, direction: 1 | -1): Contour {
  return direction > 0 || contour.kind !== 'path' ? contour : mirrorPath(contour);
}

export function responseOf(derived: Derived, index: number): Response {
  const { design, turn, sections } = derived;
  const result = sections[index]!;
  const section = design.sections[index]!;
  const { law } = result;
  const { share, packs } = arrangementOf(design);
  const rotor = { outside: ccw(result.rotor.outside, turn.direction) };
  const stator = { outside: ccw(result.stator.outside, turn.direction) };
  if (rotor.outside.kind !== 'path') throw new TypeError('invalid rotor outline: a circle');
  const blade = bladeOf(rotor.outside, design.rotorSector, BLADE_STEPS);
  const inLaw = law.angle.flatMap((angle, i) =>
    angle >= law.from - 1e-12 && angle <= law.to + 1e-12 ? [i] : [],
  );
  const picks = Array.from(
    { length: LOOKS },
    (_, i) => inLaw[Math.round((i * (inLaw.length - 1)) / (LOOKS - 1))]!,
  );
  const angle = picks.map((i) => law.angle[i]!);
  const mesh = angle.map((shaft) => shaft + turn.meshAtOpen);
  const overlaps = overlapAt(rotor, stator, mesh, { cutoutRadius: design.cutoutRadius, blade });
  const epsilon = EPSILON_0 * section.permittivity * share;

  const cache = createEdgeCache();
  const restWith = (airGap: number): number[] => {
    const setting = settingOf(design, turn, { ...section, airGap }, cache);
    const plates = platesOf(setting, blade);
    return overlaps.map(
      (overlap, i) =>
        gapCapacitance(setting.edges, plates, null, overlap, mesh[i]!) -
        overlap.area / setting.airGap,
    );
  };
  const step = STEP * section.airGap;
  const wider = restWith(section.airGap + step);
  const narrower = restWith(section.airGap - step);

  const area = overlaps.map((overlap) => epsilon * overlap.area);
  return {
    angle,
    target: picks.map((i) => law.target[i]!),
    nominal: picks.map((i) => law.achieved[i]!),
    area,
    areaPerAngle: area.map((_, i) => {
      const [a, b] = [Math.max(0, i - 1), Math.min(LOOKS - 1, i + 1)];
      return (area[b]! - area[a]!) / (angle[b]! - angle[a]!);
    }),
    outline: overlaps.map(({ rotorEdge }) => epsilon * rotorEdge),
    cutout: overlaps.map(({ cutoutEdge }) => epsilon * cutoutEdge),
    restPerGap: wider.map((rest, i) => (epsilon * (rest - narrower[i]!)) / (2 * step)),
    gap: result.electricalGap,
    gaps: result.gaps,
    rotorPlates: section.rotorPlates,
    statorPlates: section.statorPlates,
    packs,
    range: result.totalMax - result.totalMin,
  };
}
