/** Checks before cutting: what leaves no plate at all. Each says what to change, by how much. */

import { arrangementOf } from './arrangement';
import { longestRadius, type Blade } from './blade';
import type { Turn } from './derived';
import type { Design, Section } from './design';
import type { EarShape } from './ear';
import type { Finding } from './finding';
import { formatQuantity } from './quantity';
import type { BladeProblem } from './solve-blade';
import type { StatorRadius } from './stator';

const mm = (value: number): string => formatQuantity(value, 'length', 4);

/** mm. Plates beyond this are not drawn: twice the largest radius that a design may ask for. */
const LARGEST_DRAWN = 600;

/** rad. Two blades or two stators leave at least this between them. */
const LEAST_BETWEEN = (4 * Math.PI) / 180;

/** Of half a turn, what each of two blades may well take. */
const LOBE_SECTOR = 85 / 180;

/** rad. A law over less than this is not one to cut plates for. */
const LEAST_LAW = (20 * Math.PI) / 180;

/** Shapes that contradict themselves, whatever the law. */
export function shapeFindings(design: Design, section: Section, index: number): Finding[] {
  const findings: Finding[] = [];
  const { rotorPlates, statorPlates } = section;
  if (Math.abs(rotorPlates - statorPlates) > 1) {
    findings.push({
      code: 'plate-counts',
      severity: 'fail',
      section: index,
      label: 'Rotor and stator plates alternate',
      value: statorPlates,
      limit: statorPlates > rotorPlates ? rotorPlates + 1 : Math.max(1, rotorPlates - 1),
      quantity: 'count',
      change: `Take ${Math.max(1, rotorPlates - 1)} to ${rotorPlates + 1} stator plates for ${rotorPlates} rotor plates.`,
      parameters: ['statorPlates', 'rotorPlates'],
    });
  }
  const { dielectric, filmThickness, airGap } = section;
  if (dielectric === 'film' && filmThickness >= airGap) {
    findings.push({
      code: 'web-thin',
      severity: 'fail',
      section: index,
      label: 'Air left beside the film',
      value: airGap - filmThickness,
      limit: 0,
      quantity: 'length',
      change: `Take a film thinner than the air gap of ${mm(airGap)}, or a solid disc.`,
      parameters: ['filmThickness', 'airGap'],
    });
  }
  if (dielectric === 'disc' && rotorPlates + statorPlates > 2) {
    findings.push({
      code: 'plate-counts',
      severity: 'fail',
      section: index,
      label: 'One rotor and one stator plate on the disc',
      value: rotorPlates + statorPlates,
      limit: 2,
      quantity: 'count',
      change: 'A solid disc lies between one rotor and one stator plate: take one of each.',
      parameters: ['rotorPlates', 'statorPlates'],
    });
  }
  const shaft = design.shaftDiameter / 2;
  const rings = [
    { radius: design.hubRadius, label: 'Hub', key: 'hubRadius' },
    { radius: design.spacerRadius, label: 'Rotor spacer', key: 'spacerRadius' },
  ];
  for (const ring of rings) {
    if (ring.radius <= shaft) {
      findings.push({
        code: 'web-thin',
        severity: 'fail',
        section: null,
        label: `${ring.label} round the shaft`,
        value: ring.radius - shaft,
        limit: 0,
        quantity: 'length',
        change: `Make its radius larger than the shaft's ${mm(shaft)}.`,
        parameters: [ring.key, 'shaftDiameter'],
      });
    }
    if (ring.radius >= design.cutoutRadius) {
      findings.push({
        code: 'cutout-clearance',
        severity: 'fail',
        section: null,
        label: `${ring.label} inside the stator cut-out`,
        value: design.cutoutRadius - ring.radius,
        limit: section.airGap,
        quantity: 'length',
        change: `Make the cut-out radius at least ${mm(ring.radius + section.airGap)}.`,
        parameters: ['cutoutRadius', ring.key],
      });
    }
  }
  return findings;
}

/**
 * How to bring the longest rotor radius down: the swept area goes as gap over gaps.
 * @param sweep longest rotor radius now, mm
 * @param wanted the radius that would fit, mm
 */
export function smallerRadius(
  design: Design,
  section: Section,
  sweep: number,
  wanted: number,
): string {
  const rc2 = design.cutoutRadius ** 2;
  if (wanted <= design.cutoutRadius)
    return 'Make the cut-out and what surrounds the rotor smaller.';
  const factor = (sweep ** 2 - rc2) / (wanted ** 2 - rc2);
  const gaps = section.rotorPlates + section.statorPlates - 1;
  const plates = Math.ceil(gaps * factor) + 1;
  return `Take about ${plates} plates in all, or an air gap of about ${mm(section.airGap / factor)}.`;
}

/** A turn that contradicts itself, whatever the sections. */
export function turnFindings(design: Design, turn: Turn): Finding[] {
  const { travel, rotorSector, statorSector } = design;
  const { lawFrom, lawTo, meshAtOpen } = turn;
  const degrees = (angle: number): string => formatQuantity(angle, 'angle', 4);
  const finding = (
    rest: Pick<Finding, 'label' | 'value' | 'limit' | 'change' | 'parameters'>,
  ): Finding => ({ code: 'turn', severity: 'fail', section: null, quantity: 'angle', ...rest });
  const findings: Finding[] = [];
  const law = lawTo - lawFrom;
  if (law < LEAST_LAW) {
    findings.push(
      finding({
        label: 'Turn left for the law',
        value: law,
        limit: LEAST_LAW,
        change: `Shorten the rests, or make the travel at least ${degrees(travel - law + LEAST_LAW)}.`,
        parameters: ['openRest', 'meshedRest', 'travel'],
      }),
    );
  }
  const begins = meshAtOpen + lawFrom;
  if (begins < -1e-9) {
    findings.push(
      finding({
        label: 'Mesh where the law begins',
        value: begins,
        limit: 0,
        change: `The leading edge is still short of the stator: make the rest before the law at least ${degrees(travel - rotorSector)}, or the rotor sector larger.`,
        parameters: ['openRest', 'rotorSector', 'travel'],
      }),
    );
  }
  const { lobes, stators, passesOn } = arrangementOf(design);
  const pitch = (2 * Math.PI) / lobes;
  const crowded = lobes > 1 && rotorSector + statorSector > pitch - LEAST_BETWEEN;
  if (crowded) {
    findings.push(
      finding({
        label: 'Rotor and stator sector together, with two blades',
        value: rotorSector + statorSector,
        limit: pitch - LEAST_BETWEEN,
        change: `Two blades take a quarter turn each: make rotor and stator sector about ${degrees(LOBE_SECTOR * pitch)} and the travel ${degrees(pitch / 2)}.`,
        parameters: ['rotorSector', 'statorSector', 'travel'],
      }),
    );
  }
  if (stators.length > 1 && statorSector > Math.PI - LEAST_BETWEEN) {
    findings.push(
      finding({
        label: 'Stator sector, with two stators',
        value: statorSector,
        limit: Math.PI - LEAST_BETWEEN,
        change: `Two stators share the turn: make the stator sector at most ${degrees(Math.PI - LEAST_BETWEEN)}.`,
        parameters: ['statorSector'],
      }),
    );
  }
  // At the open stop the trailing edge must not have reached the last edge of the next stator.
  const apart = pitch - travel - statorSector;
  if (apart < -1e-9 && !passesOn && !crowded) {
    findings.push(
      finding({
        label: 'Room behind the rotor at the open stop',
        value: apart,
        limit: 0,
        change: `Make the stator sector at most ${degrees(pitch - travel)} for this travel.`,
        parameters: ['statorSector', 'travel'],
      }),
    );
  }
  return findings;
}

/** A blade this near its least radius, as a fraction, lies on it. */
export const ON_LEAST_RADIUS = 1e-9;

/**
 * The blade must reach over the cut-out everywhere, or the edge model has nothing to stand on.
 * @param mostGaps tells with how many gaps it would; asked only when it does not
 */
export function bladeFinding(
  design: Design,
  index: number,
  problem: BladeProblem,
  blade: Blade,
  mostGaps: () => number,
): Finding | null {
  const last = blade.radius.length - 1;
  let at = 0;
  blade.radius.forEach((radius, i) => {
    if (radius < blade.radius[at]!) at = i;
  });
  const radius = blade.radius[at]!;
  if (radius > problem.leastRadius * (1 + ON_LEAST_RADIUS)) return null;
  const phi = (blade.sector * at) / last;
  const gaps = mostGaps();
  return {
    code: 'outline-infeasible',
    severity: 'fail',
    section: index,
    label: `Blade over the stator cut-out, ${formatQuantity(phi, 'angle', 3)} behind its leading edge`,
    value: radius - design.cutoutRadius,
    limit: problem.leastRadius - design.cutoutRadius,
    quantity: 'length',
    change:
      gaps > 0
        ? `The law rises too slowly there for so many gaps: take ${gaps + 1} plates in all or fewer, a smaller cut-out or a larger open capacitance.`
        : 'The law rises too slowly there even for one gap: take a smaller cut-out or a larger open capacitance.',
    parameters: ['rotorPlates', 'cutoutRadius', 'airGap'],
  };
}

export function hugeFinding(
  design: Design,
  section: Section,
  index: number,
  blade: Blade,
): Finding | null {
  const sweep = longestRadius(blade);
  if (sweep <= LARGEST_DRAWN) return null;
  return {
    code: 'radius',
    severity: 'fail',
    section: index,
    label: 'Longest rotor radius',
    value: sweep,
    limit: design.largestRadius,
    quantity: 'length',
    change: smallerRadius(design, section, sweep, design.largestRadius),
    parameters: ['rotorPlates', 'airGap'],
  };
}

/** Ears side by side, and inside the stator's straight edges. */
export function earFinding(
  design: Design,
  ears: readonly EarShape[],
  radiusAt: StatorRadius,
  overEdge = false,
): Finding | null {
  const half = Math.max(
    ...ears.map(({ angle, earRadius: re, circleRadius: rp }) =>
      Math.asin(Math.min(1, re / Math.min(rp, radiusAt(angle)))),
    ),
  );
  const room = design.statorSector / design.postCount / 2;
  if (half <= room && !overEdge) return null;
  return {
    code: 'ears-crowded',
    severity: 'fail',
    section: null,
    label: 'Room for the stator ears side by side',
    value: 2 * half,
    limit: 2 * room,
    quantity: 'angle',
    change:
      design.postCount > 2
        ? 'Take fewer posts, smaller post holes or less metal round them.'
        : 'Take smaller post holes or less metal round them.',
    parameters: ['postCount', 'postHoleDiameter', 'postWeb'],
  };
}

export function postFinding(design: Design, ears: readonly EarShape[]): Finding | null {
  const nearest = Math.min(...ears.map((ear) => ear.circleRadius - ear.earRadius));
  if (nearest > design.cutoutRadius) return null;
  const least = design.cutoutRadius + ears[0]!.earRadius;
  return {
    code: 'post-clearance',
    severity: 'fail',
    section: null,
    label: 'Post holes outside the stator cut-out',
    value: nearest,
    limit: design.cutoutRadius,
    quantity: 'length',
    change: `Make the post circle radius larger than ${mm(least)}, or leave it empty.`,
    parameters: ['postCircleRadius'],
  };
}
