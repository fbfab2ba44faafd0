/** Derives one section: target, blade, both plates, posts and the back-check. */

import { arrangementOf, gapsOf } from './arrangement';
import { longestRadius, shortestRadius, type Blade } from './blade';
import { EPSILON_0 } from './constants';
import type { FieldModel, Plate, Post, SectionResult, Turn } from './derived';
import type { Design } from './design';
import { electricalGap } from './dielectric';
import { bladeFinding, hugeFinding, ON_LEAST_RADIUS, shapeFindings } from './feasibility';
import { cellField, sectionEdges, type EdgeCache } from './field/cell-field';
import type { PlanShare } from './field/plan-share';
import type { Finding } from './finding';
import type { Law } from './law';
import { checkLaw } from './law-check';
import { sheetMaterials } from './material';
import { contourArea, contourLength } from './measure';
import { mirrorCircle, mirrorPath, mirrorPoint } from './mirror';
import { lawOf } from './own-law';
import { standPosts } from './post';
import { bladeOf } from './rotor';
import {
  farSideOf,
  outlinesOf,
  platesOf,
  shareOf,
  type Outlines,
  type Setting,
} from './setting';
import { BLADE_STEPS, firstBlade, nextBlade, type BladeProblem } from './solve-blade';
import { endPlatesOf, rotorSpacerLength, statorSpacerLength } from './stack';
import { statorFormOf } from './stator';
import { targetOf } from './target';

/** Steps of the inverse with the edges alone, then rounds with the plan view, and steps in each. */
const EDGE_STEPS = 5;
const PLAN_ROUNDS = 1;
const STEPS_PER_ROUND = 2;

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

interface Solved {
  readonly blade: Blade;
  readonly outlines: Outlines;
  readonly share: PlanShare | null;
}

function nextOf(
  setting: Setting,
  problem: BladeProblem,
  share: PlanShare | null,
  blade: Blade,
): Blade {
  const range = [problem.from, problem.to] as const;
  return nextBlade(
    problem,
    blade,
    cellField(setting.gaps, setting.edges, platesOf(setting, blade), share, range),
  );
}

/** The blade that has the law with the edges alone. */
function bladeWithEdges(setting: Setting, problem: BladeProblem): Blade {
  let blade = firstBlade(problem, setting.edges.outerEdge);
  for (let i = 0; i < EDGE_STEPS; i++) blade = nextOf(setting, problem, null, blade);
  return blade;
}

/** Of the gaps that would do with the edges alone, those that do with the plan view as well. */
const SURE_SHARE = 0.85;

/** Most gaps with which the blade still reaches over the cut-out, edges alone; 0 if none. */
function mostGaps(setting: Setting, problem: BladeProblem, gaps: number): number {
  let works = 0;
  let fails = gaps;
  while (fails - works > 1) {
    const tried = (works + fails) >> 1;
    const wanted = (angle: number): number => (problem.wanted(angle) * gaps) / tried;
    const blade = bladeWithEdges(setting, { ...problem, wanted });
    if (shortestRadius(blade) > problem.leastRadius * (1 + ON_LEAST_RADIUS)) works = tried;
    else fails = tried;
  }
  return works;
}

/** The blade that has the law in the field model asked for. */
function solveBlade(
  setting: Setting,
  problem: BladeProblem,
  model: FieldModel,
  check: (blade: Blade) => Finding | null,
): Solved | Finding {
  let blade = bladeWithEdges(setting, problem);
  let share: PlanShare | null = null;
  let wrong = check(blade);
  for (let round = 0; round < PLAN_ROUNDS && model === 'field' && !wrong; round++) {
    const outlines = outlinesOf(setting, blade);
    if ('code' in outlines) return outlines;
    share = shareOf(setting, blade, outlines, share);
    for (let i = 0; i < STEPS_PER_ROUND; i++) blade = nextOf(setting, problem, share, blade);
    wrong = check(blade);
  }
  if (wrong) return wrong;
  const outlines = outlinesOf(setting, blade);
  return 'code' in outlines ? outlines : { blade, outlines, share };
}

/** @param scale of the law's capacitance to what one blade has per gap, over ε, F/mm */
function problemOf(setting: Setting, law: Law, scale: number): BladeProblem {
  const { design, turn, airGap } = setting;
  const from = turn.meshAtOpen + turn.lawFrom;
  const to = turn.meshAtOpen + turn.lawTo;
  return {
    wanted: (angle) => law.slope((angle - from) / (to - from)) / (to - from) / scale,
    from,
    to,
    rotorSector: design.rotorSector,
    statorSector: design.statorSector,
    airGap,
    cutoutRadius: design.cutoutRadius,
    edgeOffset: design.statorEdgeOffset,
    leastRadius: design.cutoutRadius + airGap / 2,
  };
}

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
  const target = targetOf(section, index);
  if ('code' in target) return refused(target, ...blocked);
  if (blocked.length > 0) return refused(...blocked);

  const law = lawOf(section, index, target);
  if ('code' in law) return refused(law);
  const { totalMin, totalMax, stray, inductance } = target;
  const arrangement = arrangementOf(design);
  const gaps = gapsOf(section);
  const airGap = electricalGap(section);
  const edges = sectionEdges({ ...design, ...section, airGap }, cache);
  const form = statorFormOf(section, arrangement);
  const setting: Setting = {
    design,
    section,
    arrangement,
    turn,
    form,
    edges,
    airGap,
    gaps,
    endPlates: endPlatesOf(section),
  };
  const permittivity = EPSILON_0 * section.permittivity * arrangement.share;
  const problem = problemOf(setting, law, permittivity * gaps);
  const solved = solveBlade(
    setting,
    problem,
    model,
    (blade) =>
      bladeFinding(design, index, problem, blade, () =>
        Math.floor(SURE_SHARE * mostGaps(setting, problem, gaps)),
      ) ?? hugeFinding(design, section, index, blade),
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
