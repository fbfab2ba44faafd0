/** From a section's law to its blade: the inverse, step by step. */

import { shortestRadius, type Blade } from './blade';
import type { FieldModel } from './derived';
import { ON_LEAST_RADIUS } from './feasibility';
import { cellField } from './field/cell-field';
import type { PlanShare } from './field/plan-share';
import type { Finding } from './finding';
import type { Law } from './law';
import { outlinesOf, platesOf, shareOf, type Outlines, type Setting } from './setting';
import { firstBlade, nextBlade, type BladeProblem } from './solve-blade';

/** Steps of the inverse with the edges alone, then rounds with the plan view, and steps in each. */
const EDGE_STEPS = 5;
const PLAN_ROUNDS = 1;
const STEPS_PER_ROUND = 2;

export interface Solved {
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
export function bladeWithEdges(
  setting: Setting,
  problem: BladeProblem,
  steps = EDGE_STEPS,
): Blade {
  let blade = firstBlade(problem, setting.edges.outerEdge);
  for (let i = 0; i < steps; i++) blade = nextOf(setting, problem, null, blade);
  return blade;
}

/** Of the gaps that would do with the edges alone, those that do with the plan view as well. */
const SURE_SHARE = 0.85;

/** About the most gaps with which the blade still reaches over the cut-out; 0 if none. */
export function mostGaps(setting: Setting, problem: BladeProblem): number {
  const { gaps } = setting;
  let works = 0;
  let fails = gaps;
  while (fails - works > 1) {
    const tried = (works + fails) >> 1;
    const wanted = (angle: number): number => (problem.wanted(angle) * gaps) / tried;
    const blade = bladeWithEdges(setting, { ...problem, wanted });
    if (shortestRadius(blade) > problem.leastRadius * (1 + ON_LEAST_RADIUS)) works = tried;
    else fails = tried;
  }
  return Math.floor(SURE_SHARE * works);
}

/** The blade that has the law in the field model asked for. */
export function solveBlade(
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

/** What the blade has to do for a law. */
export function problemOf(setting: Setting, law: Law): BladeProblem {
  const { design, turn, airGap, permittivity, gaps } = setting;
  const scale = permittivity * gaps;
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
