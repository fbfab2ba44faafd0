/** One section while its blade is solved: what stays the same, and the plates that a blade makes. */

import { arrangementOf, gapsOf, type Arrangement } from './arrangement';
import { longestRadius, type Blade } from './blade';
import { coarsePolygon } from './coarse-polygon';
import { EPSILON_0 } from './constants';
import type { PlateRole, Turn } from './derived';
import type { Design, Section } from './design';
import { electricalGap } from './dielectric';
import type { EarShape } from './ear';
import { earFinding, postFinding } from './feasibility';
import { sectionEdges, type EdgeCache, type SectionEdges } from './field/cell-field';
import { mirroredShape, turned, type PlanShape } from './field/plan-shape';
import { planShare, type EnergySum, type PlanShare } from './field/plan-share';
import type { EdgePlates } from './field/radial-edges';
import type { Finding } from './finding';
import { flatten } from './flatten';
import { edgePlates } from './law-check';
import { polar } from './polar';
import { layOutEars } from './post';
import { rotorOutline, type RotorOutline } from './rotor';
import { endPlatesOf } from './stack';
import {
  statorFormOf,
  statorOutline,
  statorRadius,
  type StatorForm,
  type StatorOutline,
} from './stator';

/** mm. Sagitta of the polygons on which the plan view is solved. */
const PLAN_SAGITTA = 0.1;

/** mm. Corners nearer than this to a straight line between others are left out there. */
const PLAN_STRAIGHT = 0.02;

export interface Setting {
  readonly design: Design;
  readonly section: Section;
  readonly arrangement: Arrangement;
  readonly turn: Turn;
  readonly form: StatorForm;
  readonly edges: SectionEdges;
  /** mm, {@link electricalGap}. */
  readonly airGap: number;
  readonly gaps: number;
  readonly endPlates: readonly [PlateRole, PlateRole];
  /** ε of the gap, times what the terminals see of one blade with its stator, F/mm. */
  readonly permittivity: number;
}

export function settingOf(
  design: Design,
  turn: Turn,
  section: Section,
  cache: EdgeCache,
): Setting {
  const arrangement = arrangementOf(design);
  const airGap = electricalGap(section);
  return {
    design,
    section,
    arrangement,
    turn,
    form: statorFormOf(section, arrangement),
    edges: sectionEdges({ ...design, ...section, airGap }, cache),
    airGap,
    gaps: gapsOf(section),
    endPlates: endPlatesOf(section),
    permittivity: EPSILON_0 * section.permittivity * arrangement.share,
  };
}

/** The plates of a blade as the edge model sees them. */
export function platesOf(
  { design, arrangement, form, airGap }: Setting,
  blade: Blade,
): EdgePlates {
  const radiusAt = statorRadius(form, blade, design.overhang);
  return edgePlates(blade, {
    statorFirst: radiusAt(0),
    statorLast: radiusAt(design.statorSector),
    statorSector: design.statorSector,
    cutoutRadius: design.cutoutRadius,
    edgeOffset: design.statorEdgeOffset,
    airGap,
    toNextStator: arrangement.passesOn ? null : (2 * Math.PI) / arrangement.lobes,
  });
}

export interface Outlines {
  readonly rotor: RotorOutline;
  readonly stator: StatorOutline;
  readonly ears: readonly EarShape[];
}

/** Both outlines for a blade, or the finding that says why there is none. */
export function outlinesOf(setting: Setting, blade: Blade): Outlines | Finding {
  const { design, arrangement, turn, form } = setting;
  const radiusAt = statorRadius(form, blade, design.overhang);
  const ears = layOutEars(design, turn, blade, form);
  const crowded = postFinding(design, ears) ?? earFinding(design, ears, radiusAt);
  if (crowded) return crowded;
  const stator = statorOutline(design, ears, radiusAt);
  if (!stator) return earFinding(design, ears, radiusAt, true)!;
  const { hubRadius, shaftDiameter } = design;
  const rotor = rotorOutline(blade, hubRadius, shaftDiameter, arrangement.lobes);
  return { rotor, stator, ears };
}

function planShape(setting: Setting, blade: Blade, outlines: Outlines): PlanShape {
  const { design, arrangement, gaps, endPlates } = setting;
  const { rotor, stator, ears } = outlines;
  const first = coarsePolygon(flatten(stator.outside, PLAN_SAGITTA), PLAN_STRAIGHT);
  return {
    plates: platesOf(setting, blade),
    rotor: coarsePolygon(flatten(rotor.outside, PLAN_SAGITTA), PLAN_STRAIGHT),
    stators: arrangement.stators.map((standsAt) => turned(first, standsAt)),
    statorAngles: arrangement.stators,
    lobeAngles: Array.from(
      { length: arrangement.lobes },
      (_, i) => (2 * Math.PI * i) / arrangement.lobes,
    ),
    posts: arrangement.stators.flatMap((standsAt, which) =>
      ears.map(({ angle, circleRadius }) => ({
        ...polar(circleRadius, angle + standsAt),
        radius: design.postSpacerRadius,
        stator: which,
      })),
    ),
    hubRadius: design.hubRadius,
    sweepRadius: longestRadius(blade),
    gaps,
    endPlates,
  };
}

/** The energies that make up the capacitance of one blade with its stator. */
function energiesOf({ lobes, passesOn }: Arrangement): EnergySum {
  if (lobes === 2) {
    // Rotor half way between the stators: each blade holds a quarter of what it would alone.
    return [{ weight: 2, potentials: { rotor: 0.5, stators: [0, 1] } }];
  }
  if (!passesOn) return [{ weight: 1, potentials: { rotor: 1, stators: [0] } }];
  return [
    { weight: 0.5, potentials: { rotor: 1, stators: [0, 0] } },
    { weight: 0.5, potentials: { rotor: 0, stators: [1, 0] } },
    { weight: -0.5, potentials: { rotor: 0, stators: [0, 1] } },
  ];
}

/** @param near the share of nearly the same blade */
export function shareOf(
  setting: Setting,
  blade: Blade,
  outlines: Outlines,
  near: PlanShare | null,
): PlanShare {
  const { arrangement, turn, edges } = setting;
  return planShare(
    planShape(setting, blade, outlines),
    edges.table,
    edges.hub,
    [turn.meshAtOpen, turn.meshAtOpen + turn.travel],
    energiesOf(arrangement),
    near,
  );
}

/** The second stator of a rotor that passes on, seen from its far side: as if it came first. */
export interface FarSide {
  readonly plates: EdgePlates;
  readonly share: PlanShare | null;
  /** Mesh angle there for one at the first stator, rad. */
  readonly meshAngle: (meshAngle: number) => number;
}

export function farSideOf(
  setting: Setting,
  blade: Blade,
  outlines: Outlines,
  withPlan: boolean,
): FarSide {
  const { design, arrangement, turn, edges } = setting;
  const shape = mirroredShape(planShape(setting, blade, outlines));
  const sum = design.statorSector + design.rotorSector - Math.PI;
  const meshAngle = (angle: number): number => sum - angle;
  const open = meshAngle(turn.meshAtOpen);
  return {
    plates: shape.plates,
    meshAngle,
    share: withPlan
      ? planShare(
          shape,
          edges.table,
          edges.hub,
          [open - turn.travel, open],
          energiesOf(arrangement),
        )
      : null,
  };
}
