/** Derives one section: target, blade, both plates, posts and the back-check. */

import { longestRadius, shortestRadius } from './blade';
import type { FieldModel, Plate, Post, SectionResult, Turn } from './derived';
import type { Design } from './design';
import { bladeFinding, hugeFinding, shapeFindings } from './feasibility';
import type { EdgeCache } from './field/cell-field';
import type { Finding } from './finding';
import { mostGaps, problemOf, solveBlade } from './inverse';
import { checkLaw } from './law-check';
import { sheetMaterials } from './material';
import { contourArea, contourLength } from './measure';
import { mirrorCircle, mirrorPath, mirrorPoint } from './mirror';
import { lawOf } from './own-law';
import { standPosts } from './post';
import { bladeOf } from './rotor';
import { farSideOf, platesOf, settingOf, shareOf } from './setting';
import { BLADE_STEPS } from './solve-blade';
import { rotorSpacerLength, statorSpacerLength } from './stack';
import { targetOf } from './target';

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

/** A plate for the other sense of turning. */
function mirrored(plate: Plate): Plate {
  const { outside, holes } = plate;
  return {
    ...plate,
    outside: outside.kind === 'path' ? mirrorPath(outside) : mirrorCircle(outside),
    holes: holes.map(mirrorCircle),
  };
}

export type SectionOutcome =
  | { readonly ok: true; readonly result: SectionResult }
  | { readonly ok: false; readonly findings: readonly Finding[] };

const refused = (...findings: Finding[]): SectionOutcome => ({ ok: false, findings });

/** The finished section, or the failing findings that leave nothing to cut. */
export function deriveSection(
  design: Design,
  turn: Turn,
  index: number,
  model: FieldModel,
  cache: EdgeCache,
): SectionOutcome {
  const section = design.sections[index]!;
  const blocked = shapeFindings(design, section, index);
  const first = design.sections[0]!;
  const target = targetOf(section, index, first);
  if ('code' in target) return refused(target, ...blocked);
  if (blocked.length > 0) return refused(...blocked);

  const law = lawOf(section, index, target, first);
  if ('code' in law) return refused(law);
  const { totalMin, totalMax, stray, inductance } = target;
  const setting = settingOf(design, turn, section, cache);
  const { arrangement, gaps, airGap, edges, form, permittivity } = setting;
  const problem = problemOf(setting, law);
  const solved = solveBlade(
    setting,
    problem,
    model,
    (blade) =>
      bladeFinding(design, index, problem, blade, () => mostGaps(setting, problem)) ??
      hugeFinding(design, section, index, blade),
  );
  if ('code' in solved) return refused(solved);

  const { blade, outlines, share } = solved;
  const rotor = plateOf(design, index, {
    role: 'rotor',
    outside: outlines.rotor.outside,
    holes: outlines.rotor.holes,
    fitDeviation: outlines.rotor.fitDeviation,
    thickness: section.rotorThickness,
    quantity: section.rotorPlates * arrangement.packs,
  });
  const stator = plateOf(design, index, {
    role: 'stator',
    outside: outlines.stator.outside,
    holes: outlines.stator.holes,
    fitDeviation: outlines.stator.fitDeviation,
    thickness: section.statorThickness,
    quantity: section.statorPlates * arrangement.packs * arrangement.stators.length,
  });
  const cutBlade = bladeOf(outlines.rotor.outside, design.rotorSector, BLADE_STEPS);
  const checked = checkLaw({
    law,
    turn,
    totalMin,
    totalMax,
    fixed: stray + section.frameAllowance,
    rotor,
    stator,
    blade: cutBlade,
    permittivity,
    gaps,
    edges,
    plates: platesOf(setting, cutBlade),
    share: share && shareOf(setting, cutBlade, outlines, share),
    frame: section.frameAllowance,
    farSide: arrangement.passesOn
      ? farSideOf(setting, cutBlade, outlines, model === 'field')
      : null,
  });
  const posts = standPosts(design, turn, outlines.ears, blade);
  const clockwise = turn.direction < 0;
  return {
    ok: true,
    result: {
      totalMin,
      totalMax,
      ownMin: totalMin - stray,
      ownMax: totalMax - stray,
      stray,
      platesOpen: checked.platesOpen,
      platesAtLaw: checked.platesAtLaw,
      frame: section.frameAllowance,
      trimmer: checked.trimmer,
      inductance,
      gaps,
      statorAngles: arrangement.stators,
      terminals: arrangement.terminals,
      airGap: section.airGap,
      electricalGap: airGap,
      model,
      statorForm: form,
      rotor: clockwise ? mirrored(rotor) : rotor,
      stator: clockwise ? mirrored(stator) : stator,
      posts: clockwise ? posts.map((post: Post) => mirrorPoint(post)) : posts,
      law: checked.law,
      sweepRadius: longestRadius(blade),
      narrowestBlade: shortestRadius(blade) - design.hubRadius,
      rotorSpacer: rotorSpacerLength(section),
      statorSpacer: statorSpacerLength(section),
    },
  };
}
