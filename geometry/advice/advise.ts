/**
 * Which plate counts and air gaps reach a section's target inside the room allowed. Each pair is
 * solved with the edges alone and few steps, so radii are estimates; whoever takes one has it
 * derived in full.
 */

import { arrangementOf, gapsOf } from '../arrangement';
import { bladeRadius, longestRadius, shortestRadius, type Blade } from '../blade';
import { EPSILON_0 } from '../constants';
import type { Turn } from '../derived';
import type { Design, Section } from '../design';
import { electricalGap } from '../dielectric';
import { practiceVoltage } from '../electrical/breakdown';
import { airPath } from '../electrical/gap';
import { ON_LEAST_RADIUS } from '../feasibility';
import type { EdgeCache } from '../field/cell-field';
import { bladeWithEdges, problemOf } from '../inverse';
import type { Law } from '../law';
import { sheetMaterials } from '../material';
import { lawOf } from '../own-law';
import { roomBetween } from '../stack';
import { settingOf } from '../setting';
import { statorRadius, type StatorForm } from '../stator';
import { targetOf } from '../target';
import { turnOf } from '../turn';

export interface Candidate {
  readonly airGap: number;
  readonly rotorPlates: number;
  readonly statorPlates: number;
  /** Estimates, mm: the rotor's sweep, and the furthest point of the stator's ears. */
  readonly sweepRadius: number;
  readonly outerRadius: number;
  /** mm */
  readonly depth: number;
  /** Narrowest blade over the hub, mm. */
  readonly narrowestBlade: number;
  /** 1 kV peak for each millimetre of air, less in thin air, between the terminals, V. */
  readonly voltage: number;
  /** Estimate of all plates of the section, g. */
  readonly mass: number;
}

/** Steps of the inverse for a candidate. */
const STEPS = 2;

/** Air gaps looked at, mm: as sheet and spacers come in a workshop. */
export const GAPS: readonly number[] = [
  0.2, 0.25, 0.3, 0.35, 0.4, 0.45, 0.5, 0.6, 0.7, 0.8, 0.9, 1, 1.2, 1.5, 2, 2.5, 3, 4, 5, 6, 8,
  10,
];

/** Most rotor plates looked at with one gap; larger numbers are spread out. */
const COUNTS = 14;

function depthOf(section: Section): number {
  const { airGap, rotorPlates, statorPlates, rotorThickness, statorThickness } = section;
  const gaps = rotorPlates + statorPlates - 1;
  return rotorPlates * rotorThickness + statorPlates * statorThickness + gaps * airGap;
}

/** Depth left for one set of plates of a section beside all the others, mm. */
function roomFor(design: Design, index: number): number {
  const { packs } = arrangementOf(design);
  const others = design.sections.reduce(
    (sum, section, i) => (i === index ? sum : sum + packs * depthOf(section)),
    0,
  );
  const count = design.sections.length;
  const between =
    (count - 1) * roomBetween(design) + count * (packs - 1) * design.sectionSpacing;
  return (design.largestDepth - others - between) / packs;
}

/** Rotor plate counts from 1 to the most that fit, spread evenly by ratio when they are many. */
function countsUpTo(most: number): number[] {
  if (most <= COUNTS) return Array.from({ length: Math.max(0, most) }, (_, i) => i + 1);
  const spread = Array.from({ length: COUNTS }, (_, i) =>
    Math.round(most ** (i / (COUNTS - 1))),
  );
  return [...new Set(spread)];
}

/** The sections to look at: gaps that hold the voltage, counts that fit the depth. */
export function variantsOf(design: Design, index: number): Section[] {
  const section = design.sections[index]!;
  const room = roomFor(design, index);
  return GAPS.flatMap((airGap): Section[] => {
    const plain = { ...section, airGap };
    if (section.dielectric === 'film' && section.filmThickness >= airGap) return [];
    const { length, share } = airPath(design, plain);
    if (
      length > 0 &&
      practiceVoltage(length, design.altitude) < section.workingVoltage * share
    ) {
      return [];
    }
    const pitch = section.rotorThickness + section.statorThickness + 2 * airGap;
    const most = Math.min(60, Math.floor((room - section.statorThickness) / pitch));
    return countsUpTo(section.dielectric === 'disc' ? Math.min(1, most) : most).map(
      (rotors) => ({
        ...plain,
        rotorPlates: rotors,
        statorPlates: section.dielectric === 'disc' ? 1 : rotors + 1,
      }),
    );
  });
}

/** Twice the area under the blade from the shaft, mm²: ∫ r² dφ. */
function squareUnder({ sector, radius }: Blade): number {
  const last = radius.length - 1;
  let sum = 0;
  for (let i = 0; i < last; i++) sum += (radius[i]! ** 2 + radius[i + 1]! ** 2) / 2;
  return (sum * sector) / last;
}

/** Edges make a plate smaller than its area alone says, but by less than this. */
const SURELY_OUT = 0.85;

/** Longest rotor radius by area alone, mm. */
function radiusByArea(design: Design, section: Section, turn: Turn, law: Law): number {
  const steepest =
    Math.max(law.slope(0), law.slope(0.5), law.slope(1)) / (turn.lawTo - turn.lawFrom);
  const gaps = gapsOf(section) * arrangementOf(design).share;
  return Math.sqrt(
    design.cutoutRadius ** 2 +
      (2 * electricalGap(section) * steepest) / (EPSILON_0 * section.permittivity * gaps),
  );
}

/** Furthest point of the ears, about: each post as near its part of the sweep as it may stand. */
function earsReach(design: Design, form: StatorForm, blade: Blade): number {
  const { postCount, statorSector, postClearance, postSpacerRadius, postCircleRadius } = design;
  const boss = design.postHoleDiameter / 2 + design.postWeb;
  const sweep = longestRadius(blade);
  const reaches = Array.from({ length: postCount }, (_, i) => {
    const angle = (statorSector * (i + 0.5)) / postCount;
    const near = form === 'even' ? sweep : bladeRadius(blade, blade.sector - angle);
    return (postCircleRadius ?? near + postClearance + postSpacerRadius) + boss;
  });
  return Math.max(...reaches);
}

/** A variant's figures, or null where it has no blade or no room. */
export function candidateOf(
  design: Design,
  index: number,
  variant: Section,
  cache: EdgeCache,
): Candidate | null {
  const sections = design.sections.map((section, i) => (i === index ? variant : section));
  const whole: Design = { ...design, sections };
  const target = targetOf(variant, index, sections[0]!);
  if ('code' in target) return null;
  const law = lawOf(variant, index, target, sections[0]!);
  if ('code' in law) return null;
  const turn: Turn = turnOf(whole);
  if (radiusByArea(whole, variant, turn, law) * SURELY_OUT > design.largestRadius) return null;
  const setting = settingOf(whole, turn, variant, cache);
  const problem = problemOf(setting, law);
  const blade = bladeWithEdges(setting, problem, STEPS);
  if (shortestRadius(blade) <= problem.leastRadius * (1 + ON_LEAST_RADIUS)) return null;
  const sweepRadius = longestRadius(blade);
  const { arrangement, form } = setting;
  const radiusAt = statorRadius(form, blade, design.overhang);
  const outerRadius = Math.max(
    radiusAt(0),
    radiusAt(design.statorSector),
    earsReach(design, form, blade),
  );
  if (!(outerRadius <= design.largestRadius)) return null;
  const { lobes, packs, stators } = arrangement;
  const rotor =
    (lobes * squareUnder(blade) +
      (2 * Math.PI - lobes * blade.sector) * design.hubRadius ** 2) /
    2;
  const steps = 60;
  let stator = 0;
  for (let i = 0; i < steps; i++) {
    const r = radiusAt(((i + 0.5) / steps) * design.statorSector);
    stator += ((r ** 2 - design.cutoutRadius ** 2) / 2) * (design.statorSector / steps);
  }
  const { density } = sheetMaterials[design.material];
  const { length, share } = airPath(design, variant);
  return {
    airGap: variant.airGap,
    rotorPlates: variant.rotorPlates,
    statorPlates: variant.statorPlates,
    sweepRadius,
    outerRadius,
    depth: depthOf(variant),
    narrowestBlade: shortestRadius(blade) - design.hubRadius,
    voltage: share === 0 ? 0 : practiceVoltage(length, design.altitude) / share,
    mass:
      density *
      packs *
      (rotor * variant.rotorThickness * variant.rotorPlates +
        stator * variant.statorThickness * variant.statorPlates * stators.length),
  };
}
