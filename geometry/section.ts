/** Derives one section: target, rotor curve, both plates, posts and the back-check. */

import { EPSILON_0 } from './constants';
import type { Design, Section } from './design';
import type { Plate, SectionResult } from './derived';
import { edgeFactorBetween } from './edge';
import type { Finding } from './finding';
import { outlineFindings, shapeFindings } from './feasibility';
import { lawBetween } from './law';
import { checkLaw } from './law-check';
import { sheetMaterials } from './material';
import { contourArea, contourLength } from './measure';
import { layOutPosts, standPosts } from './post';
import { solveRotorCurve } from './rotor-curve';
import { rotorOutline } from './rotor';
import { rotorSpacerLength, statorSpacerLength } from './stack';
import { statorOutline } from './stator';
import { targetOf } from './target';

/** Intervals over the travel: of the solved curve, and of the back-check and chart. */
const CURVE_STEPS = 360;
const CHECK_STEPS = 90;

type Cut = Pick<
  Plate,
  'role' | 'outside' | 'holes' | 'thickness' | 'quantity' | 'fitDeviation'
>;

function plateOf(design: Design, index: number, cut: Cut): Plate {
  const holesArea = cut.holes.reduce((sum, hole) => sum + contourArea(hole), 0);
  const area = contourArea(cut.outside) - holesArea;
  return {
    ...cut,
    section: index,
    area,
    cutLength: [cut.outside, ...cut.holes].reduce((sum, c) => sum + contourLength(c), 0),
    mass: area * cut.thickness * sheetMaterials[design.material].density,
  };
}

export type SectionOutcome =
  | { readonly ok: true; readonly result: SectionResult }
  | { readonly ok: false; readonly findings: readonly Finding[] };

/** The finished section, or the failing findings that leave nothing to cut. */
export function deriveSection(design: Design, section: Section, index: number): SectionOutcome {
  const blocked = shapeFindings(design, section, index);
  const target = targetOf(section, index);
  if ('code' in target) return { ok: false, findings: [target, ...blocked] };
  if (blocked.length > 0) return { ok: false, findings: blocked };

  const { totalMin, totalMax, stray, inductance } = target;
  const gaps = section.rotorPlates + section.statorPlates - 1;
  const model = {
    law: lawBetween(section.law, totalMin, totalMax),
    travel: design.travel,
    permittivityGaps: EPSILON_0 * section.permittivity * gaps,
    airGap: section.airGap,
    cutoutRadius: design.cutoutRadius,
    rotorEdge: edgeFactorBetween(section.rotorThickness, section.airGap),
    statorEdge: edgeFactorBetween(section.statorThickness, section.airGap),
  };
  const curve = solveRotorCurve({ ...model, steps: CURVE_STEPS });
  const sweepRadius = curve.radius.reduce((a, b) => Math.max(a, b), 0);
  const narrowest = curve.radius.reduce((a, b) => Math.min(a, b), Infinity);
  const layout = layOutPosts(design, sweepRadius);
  const statorRadius = sweepRadius + design.overhang;
  const noOutline = outlineFindings({
    design,
    section,
    index,
    model,
    curve,
    layout,
    statorRadius,
  });
  if (noOutline.length > 0) return { ok: false, findings: noOutline };

  const cutRotor = rotorOutline(curve, design.hubRadius, design.shaftDiameter);
  const cutStator = statorOutline(design, layout, statorRadius);
  const rotor = plateOf(design, index, {
    role: 'rotor',
    ...cutRotor,
    thickness: section.rotorThickness,
    quantity: section.rotorPlates,
  });
  const stator = plateOf(design, index, {
    role: 'stator',
    ...cutStator,
    thickness: section.statorThickness,
    quantity: section.statorPlates,
    fitDeviation: 0,
  });
  return {
    ok: true,
    result: {
      totalMin,
      totalMax,
      ownMin: totalMin - stray,
      ownMax: totalMax - stray,
      stray,
      inductance,
      gaps,
      rotor,
      stator,
      posts: standPosts(design, layout, curve),
      law: checkLaw({ ...model, totalMin, totalMax, rotor, stator, steps: CHECK_STEPS }),
      sweepRadius,
      narrowestBlade: narrowest - design.hubRadius,
      rotorSpacer: rotorSpacerLength(section),
      statorSpacer: statorSpacerLength(section),
    },
  };
}
