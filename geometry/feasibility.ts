/** Checks before cutting: what leaves no plate at all. Each says what to change, by how much. */

import { EPSILON_0 } from './constants';
import type { Design, Section } from './design';
import type { Finding } from './finding';
import type { CurveInput, RotorCurve } from './rotor-curve';
import { earHalfAngle, type PostLayout } from './post';
import { formatQuantity } from './quantity';

const mm = (value: number): string => formatQuantity(value, 'length', 4);

/** mm. Plates beyond this are not drawn: twice the largest radius that a design may ask for. */
const LARGEST_DRAWN = 600;

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
      limit: rotorPlates + 1,
      quantity: 'count',
      change: `Take ${Math.max(1, rotorPlates - 1)} to ${rotorPlates + 1} stator plates for ${rotorPlates} rotor plates.`,
      parameters: ['statorPlates', 'rotorPlates'],
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

export interface OutlineInput {
  readonly design: Design;
  readonly section: Section;
  readonly index: number;
  readonly model: Omit<CurveInput, 'steps'>;
  readonly curve: RotorCurve;
  readonly layout: PostLayout;
  readonly statorRadius: number;
}

/** The blade must reach over the cut-out everywhere, or the edge model has nothing to stand on. */
function bladeFinding({ design, section, index, model, curve }: OutlineInput): Finding | null {
  let at = 0;
  curve.radius.forEach((radius, i) => {
    if (radius < curve.radius[at]!) at = i;
  });
  const radius = curve.radius[at]!;
  if (radius > design.cutoutRadius) return null;
  // At r = rc the edges alone give (Fr + Fs)·rc per gap: more gaps than this overshoot the law.
  const slope = model.law.slope(at / (curve.radius.length - 1)) / design.travel;
  const perGap =
    EPSILON_0 *
    section.permittivity *
    (model.rotorEdge + model.statorEdge) *
    design.cutoutRadius;
  const mostGaps = Math.ceil(slope / perGap) - 1;
  const change =
    mostGaps >= 1
      ? `The law rises too slowly there for so many gaps: take at most ${mostGaps + 1} plates in all, a smaller cut-out or a larger open capacitance.`
      : `The law rises too slowly there even for one gap: take a smaller cut-out or a larger open capacitance.`;
  return {
    code: 'outline-infeasible',
    severity: 'fail',
    section: index,
    label: `Blade over the stator cut-out at ${formatQuantity(curve.phi[at]!, 'angle', 3)}`,
    value: radius,
    limit: design.cutoutRadius,
    quantity: 'length',
    change,
    parameters: ['rotorPlates', 'cutoutRadius', 'airGap'],
  };
}

function earFindings({ design, layout, statorRadius }: OutlineInput): Finding[] {
  const half = earHalfAngle(layout, statorRadius);
  const room = design.travel / design.postCount / 2;
  const findings: Finding[] = [];
  if (half > room) {
    findings.push({
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
    });
  }
  const inner = layout.circleRadius - layout.earRadius;
  if (inner <= design.cutoutRadius) {
    const least = design.cutoutRadius + layout.earRadius;
    findings.push({
      code: 'post-clearance',
      severity: 'fail',
      section: null,
      label: 'Post holes outside the stator cut-out',
      value: layout.circleRadius,
      limit: least,
      quantity: 'length',
      change: `Make the post circle radius larger than ${mm(least)}, or leave it empty.`,
      parameters: ['postCircleRadius'],
    });
  }
  return findings;
}

function hugeFinding({ design, section, index, curve }: OutlineInput): Finding | null {
  const sweep = curve.radius.reduce((a, b) => Math.max(a, b), 0);
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

/** What leaves no outline although the range is possible. */
export function outlineFindings(input: OutlineInput): Finding[] {
  const none = bladeFinding(input) ?? hugeFinding(input);
  return none ? [none] : earFindings(input);
}
