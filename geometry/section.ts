/** Derives one section: target, blade, both plates, posts and the back-check. */

import { longestRadius, shortestRadius, type Blade } from './blade';
import { EPSILON_0 } from './constants';
import type { Design, Section } from './design';
import type { FieldModel, Plate, PlateRole, Post, SectionResult, Turn } from './derived';
import { layOutEars, standPosts } from './post';
import {
  bladeFinding,
  earFinding,
  hugeFinding,
  ON_LEAST_RADIUS,
  postFinding,
  shapeFindings,
} from './feasibility';
import { cellField, sectionEdges, type EdgeCache, type SectionEdges } from './field/cell-field';
import { planShare, type PlanShare } from './field/plan-share';
import type { EdgePlates } from './field/radial-edges';
import type { Finding } from './finding';
import { flatten } from './flatten';
import { lawBetween, type Law } from './law';
import { checkLaw, edgePlates } from './law-check';
import { sheetMaterials } from './material';
import { contourArea, contourLength } from './measure';
import { polar } from './polar';
import { mirrorCircle, mirrorPath, mirrorPoint } from './mirror';
import { bladeOf, rotorOutline } from './rotor';
import { BLADE_STEPS, firstBlade, nextBlade, type BladeProblem } from './solve-blade';
import { endPlatesOf, rotorSpacerLength, statorSpacerLength } from './stack';
import { statorFormOf, statorOutline, statorRadius, type StatorForm } from './stator';
import { targetOf } from './target';

/** Steps of the inverse with the edges alone, then rounds with the plan view, and steps in each. */
const EDGE_STEPS = 5;
const PLAN_ROUNDS = 1;
const STEPS_PER_ROUND = 2;

/** mm. Sagitta of the polygons on which the plan view is solved. */
const PLAN_SAGITTA = 0.1;

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

/** What stays the same while the blade is solved. */
interface Setting {
  readonly design: Design;
  readonly turn: Turn;
  readonly form: StatorForm;
  readonly edges: SectionEdges;
  readonly airGap: number;
  readonly gaps: number;
  readonly endPlates: readonly [PlateRole, PlateRole];
}

function platesOf({ design, form, airGap }: Setting, blade: Blade): EdgePlates {
  const radiusAt = statorRadius(form, blade, design.overhang);
  return edgePlates(blade, {
    statorFirst: radiusAt(0),
    statorLast: radiusAt(design.statorSector),
    statorSector: design.statorSector,
    cutoutRadius: design.cutoutRadius,
    edgeOffset: design.statorEdgeOffset,
    airGap,
  });
}

/** Both outlines for a blade, or the finding that says why there is none. */
function outlinesOf({ design, turn, form }: Setting, blade: Blade) {
  const radiusAt = statorRadius(form, blade, design.overhang);
  const ears = layOutEars(design, turn, blade, form);
  const crowded = postFinding(design, ears) ?? earFinding(design, ears, radiusAt);
  if (crowded) return crowded;
  const stator = statorOutline(design, ears, radiusAt);
  if (!stator) return earFinding(design, ears, radiusAt, true)!;
  return { rotor: rotorOutline(blade, design.hubRadius, design.shaftDiameter), stator, ears };
}

type Outlines = Exclude<ReturnType<typeof outlinesOf>, Finding>;

function shareOf(
  setting: Setting,
  blade: Blade,
  { rotor, stator, ears }: Outlines,
  near: PlanShare | null,
): PlanShare {
  const { design, turn, edges, gaps, endPlates } = setting;
  return planShare(
    {
      plates: platesOf(setting, blade),
      rotor: flatten(rotor.outside, PLAN_SAGITTA),
      stator: flatten(stator.outside, PLAN_SAGITTA),
      hubRadius: design.hubRadius,
      sweepRadius: longestRadius(blade),
      gaps,
      endPlates,
      posts: ears.map(({ angle, circleRadius }) => ({
        ...polar(circleRadius, angle),
        radius: design.postSpacerRadius,
      })),
    },
    edges.table,
    edges.hub,
    [turn.meshAtOpen, turn.meshAtOpen + turn.travel],
    near,
  );
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

function problemOf(
  setting: Setting,
  section: Section,
  law: Law,
  permittivityGaps: number,
): BladeProblem {
  const { design, turn } = setting;
  const from = turn.meshAtOpen + turn.lawFrom;
  const to = turn.meshAtOpen + turn.lawTo;
  return {
    wanted: (angle) => law.slope((angle - from) / (to - from)) / (to - from) / permittivityGaps,
    from,
    to,
    rotorSector: design.rotorSector,
    statorSector: design.statorSector,
    airGap: section.airGap,
    cutoutRadius: design.cutoutRadius,
    edgeOffset: design.statorEdgeOffset,
    leastRadius: design.cutoutRadius + section.airGap / 2,
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

  const { totalMin, totalMax, stray, inductance } = target;
  const gaps = section.rotorPlates + section.statorPlates - 1;
  const law = lawBetween(section.law, totalMin, totalMax);
  const permittivityGaps = EPSILON_0 * section.permittivity * gaps;
  const edges = sectionEdges({ ...design, ...section }, cache);
  const form = statorFormOf(section);
  const setting: Setting = {
    design,
    turn,
    form,
    edges,
    airGap: section.airGap,
    gaps,
    endPlates: endPlatesOf(section),
  };
  const problem = problemOf(setting, section, law, permittivityGaps);
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
    quantity: section.rotorPlates,
  });
  const stator = plateOf(design, index, {
    role: 'stator',
    outside: outlines.stator.outside,
    holes: outlines.stator.holes,
    fitDeviation: outlines.stator.fitDeviation,
    thickness: section.statorThickness,
    quantity: section.statorPlates,
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
    permittivity: EPSILON_0 * section.permittivity,
    gaps,
    edges,
    plates: platesOf(setting, cutBlade),
    share: share && shareOf(setting, cutBlade, outlines, share),
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
