/** Checks on finished plates, as data. A check that passes is listed too: it says by how much. */

import type { Design, Section } from './design';
import type { SectionResult, Stack } from './derived';
import { smallerRadius } from './feasibility';
import type { Finding, Severity } from './finding';
import { formatQuantity } from './quantity';
import { airPath } from './electrical/gap';
import { gapLimits, gapThatHolds, worksAtRadio } from './electrical/limits';
import { tableFindings } from './table-findings';

/** Largest law error as a fraction of the range: warned of above the first, failed above the second. */
const LAW_WARN = 0.001;
const LAW_FAIL = 0.01;

/** The same at the very ends of the law. */
const LAW_ENDS = 0.005;

/** Overhang in air gaps beyond which the rotor's rim sees the stator alone. */
const DEEP_OVERHANG = 3;

/** Blade over the cut-out in air gaps below which the two edge gains run into each other. */
const DEEP_BLADE = 4;

const mm = (value: number): string => formatQuantity(value, 'length', 4);

type Ring = Pick<Finding, 'label' | 'value' | 'limit' | 'parameters'>;

function atLeast(
  code: Finding['code'],
  section: number | null,
  bad: Severity,
  check: Ring & { readonly change: string },
): Finding {
  const holds = check.value >= check.limit;
  return {
    code,
    section,
    severity: holds ? 'ok' : bad,
    quantity: 'length',
    ...check,
    change: holds ? '' : check.change,
  };
}

function lawFindings(result: SectionResult, index: number): Finding[] {
  const { largestInner, largestError, fallsAt, from, to } = result.law;
  const { fraction, angle } = largestInner;
  const severity: Severity = fraction > LAW_FAIL ? 'fail' : fraction > LAW_WARN ? 'warn' : 'ok';
  const degrees = (value: number): string => formatQuantity(value, 'angle', 3);
  const overOpen = result.platesAtLaw + result.frame > result.ownMin;
  const held: Finding = {
    code: 'law-held',
    severity,
    section: index,
    label: 'Largest law error between 5 % and 95 %, of the range',
    value: fraction,
    limit: LAW_WARN,
    quantity: 'ratio',
    change:
      severity === 'ok'
        ? ''
        : overOpen
          ? 'All of it comes from the capacitance where the law begins.'
          : `Worst at ${degrees(angle)}: longer rests before and after the law, or a smaller gap, hold it better.`,
    parameters: ['openRest', 'meshedRest', 'airGap'],
  };
  const atEnds: Finding = {
    ...held,
    severity: largestError.fraction > LAW_ENDS && !overOpen ? 'warn' : 'ok',
    label: 'Largest law error over the whole law, of the range',
    value: largestError.fraction,
    limit: LAW_ENDS,
    change:
      largestError.fraction > LAW_ENDS && !overOpen
        ? `Worst at ${degrees(largestError.angle)}: make the rest at that end longer.`
        : '',
    parameters: ['openRest', 'meshedRest'],
  };
  const rises: Finding = {
    code: 'law-rises',
    severity: fallsAt === null ? 'ok' : 'fail',
    section: index,
    label: 'Capacitance rises over the law, up to',
    value: fallsAt ?? to,
    limit: to,
    quantity: 'angle',
    change:
      fallsAt === null
        ? ''
        : `It falls near ${degrees(fallsAt)}: ${fallsAt < (from + to) / 2 ? 'let the law begin later (rest before the law), or let the stator follow the rotor.' : 'let the law end earlier (rest after the law).'}`,
    parameters:
      fallsAt !== null && fallsAt < (from + to) / 2
        ? ['openRest', 'statorForm']
        : ['meshedRest'],
  };
  return [held, atEnds, rises];
}

function openFinding({ law }: Section, result: SectionResult, index: number): Finding {
  const { platesAtLaw, frame, ownMin } = result;
  const open = platesAtLaw + frame;
  const holds = open <= ownMin;
  const over = formatQuantity(open - ownMin, 'capacitance', 3);
  return {
    code: 'open-capacitance',
    severity: holds ? 'ok' : 'fail',
    section: index,
    label: 'Plates and frame where the law begins',
    value: open,
    limit: ownMin,
    quantity: 'capacitance',
    change: holds
      ? ''
      : `Too much by ${over} before any trimmer: ask for a larger open capacitance or less stray, take a larger gap with fewer plates, or a larger cut-out radius.`,
    parameters:
      result.inductance === null
        ? [law === 'points' ? 'lawPoints' : 'minCapacitance', 'airGap', 'rotorPlates']
        : ['stray', 'inductance', 'airGap', 'rotorPlates'],
  };
}

/**
 * The least of three limits counts: common practice, the clearance table for square cut edges, and
 * what smooth plates break down at. Over the last it fails, over another it is warned of.
 */
function voltageFinding(design: Design, section: Section, index: number): Finding | null {
  const { length, share } = airPath(design, section);
  if (length === 0) return null;
  const { altitude } = design;
  const volts = (value: number): string => formatQuantity(value, 'voltage', 3);
  const atGap = section.workingVoltage * share;
  const radio = worksAtRadio(section);
  const { practice, squared, breakdown, least } = gapLimits(length, altitude, radio);
  const severity: Severity = atGap <= least ? 'ok' : atGap < breakdown ? 'warn' : 'fail';
  const enough = severity === 'ok' ? null : gapThatHolds(design, section);
  const where = altitude > 0 ? ` at ${formatQuantity(altitude, 'altitude', 4)}` : '';
  const change = [
    `This gap holds ${volts(practice)} by common practice with rounded edges (1 kV peak per millimetre at sea level)`,
    squared === null
      ? ''
      : `, ${volts(squared)} by the clearance table of IEC 60664-1 for square cut edges (inhomogeneous field)`,
    `${where}; smooth parallel plates break down near ${volts(breakdown)}${radio ? ' at radio frequency' : ''}. `,
    enough === null
      ? 'No gap in these tables holds it: take a lower voltage.'
      : `Take a gap of about ${formatQuantity(enough, 'length', 3)} or more, or a lower voltage.`,
  ].join('');
  return {
    code: 'gap-voltage',
    severity,
    section: index,
    label: share === 1 ? 'Working voltage at the gap' : 'Voltage across the air of a gap',
    value: atGap,
    limit: least,
    quantity: 'voltage',
    change: severity === 'ok' ? '' : change,
    parameters: ['airGap', 'workingVoltage'],
  };
}

function sectionFindings(design: Design, result: SectionResult, index: number): Finding[] {
  const section = design.sections[index]!;
  const { airGap, rotorThickness, statorThickness } = section;
  const overCutout = result.narrowestBlade + design.hubRadius - design.cutoutRadius;
  const clearance = Math.min(...result.posts.map((post) => post.clearance));
  return [
    ...lawFindings(result, index),
    ...tableFindings(design, section, index, result.law),
    openFinding(section, result, index),
    ...[voltageFinding(design, section, index)].filter((finding) => finding !== null),
    atLeast('blade-narrow', index, 'fail', {
      label: 'Narrowest blade, over the hub',
      value: result.narrowestBlade,
      limit: rotorThickness,
      change:
        'Narrower than the sheet is thick: take fewer plates, a larger gap or a smaller hub.',
      parameters: ['hubRadius', 'rotorPlates', 'airGap'],
    }),
    atLeast('blade-narrow', index, 'warn', {
      label: 'Narrowest blade, over the cut-out',
      value: overCutout,
      limit: DEEP_BLADE * airGap,
      change: `The edges run into each other below ${DEEP_BLADE} gaps and the law is less sure there: take fewer plates, a larger open capacitance or a smaller cut-out.`,
      parameters: ['cutoutRadius', 'rotorPlates', 'airGap'],
    }),
    atLeast('post-clearance', index, 'fail', {
      label: 'Rotor sweep to the nearest post',
      value: clearance,
      limit: Math.max(design.postClearance - 1e-9, airGap),
      change:
        clearance < 0
          ? `The rotor hits the post: move the post circle out by ${mm(design.postClearance - clearance)}.`
          : `Move the post circle out by ${mm(Math.max(design.postClearance, airGap) - clearance)}.`,
      parameters: ['postCircleRadius', 'postClearance'],
    }),
    atLeast('overhang-short', index, 'warn', {
      label: 'Stator overhang past the rotor',
      value: design.overhang,
      limit: DEEP_OVERHANG * airGap,
      change: `Below ${DEEP_OVERHANG} gaps the rim of the rotor is felt past the stator: make the overhang ${mm(DEEP_OVERHANG * airGap)}.`,
      parameters: ['overhang'],
    }),
    atLeast('cutout-clearance', index, 'fail', {
      label: 'Stator cut-out to hub and rotor spacer',
      value: design.cutoutRadius - Math.max(design.hubRadius, design.spacerRadius),
      limit: airGap,
      change: `Nearer than the air gap: make the cut-out radius at least ${mm(Math.max(design.hubRadius, design.spacerRadius) + airGap)}.`,
      parameters: ['cutoutRadius', 'hubRadius', 'spacerRadius'],
    }),
    atLeast('hole-small', index, 'warn', {
      label: 'Smallest hole against its sheet',
      value: Math.min(design.shaftDiameter, design.postHoleDiameter),
      limit: design.shaftDiameter < design.postHoleDiameter ? rotorThickness : statorThickness,
      change: 'Holes smaller than the sheet is thick cut badly: make it larger, or drill it.',
      parameters: ['postHoleDiameter', 'shaftDiameter'],
    }),
    atLeast('web-thin', index, 'warn', {
      label: 'Hub round the shaft hole',
      value: design.hubRadius - design.shaftDiameter / 2,
      limit: rotorThickness,
      change: `Make the hub radius at least ${mm(design.shaftDiameter / 2 + rotorThickness)}.`,
      parameters: ['hubRadius'],
    }),
    atLeast('web-thin', index, 'warn', {
      label: 'Metal round the post hole',
      value: design.postWeb,
      limit: statorThickness,
      change: `Make it at least ${mm(statorThickness)}.`,
      parameters: ['postWeb'],
    }),
  ];
}

/** All checks of a design whose sections have been derived. */
export function findingsOf(
  design: Design,
  results: readonly SectionResult[],
  stack: Stack,
): Finding[] {
  const widest = results.findIndex((result) => result.sweepRadius === stack.sweepRadius);
  const plates = stack.plates.length;
  const over = (value: number, limit: number): string => mm(value - limit);
  const within = (
    code: 'radius' | 'depth',
    rest: Ring & { readonly change: string },
  ): Finding => ({
    code,
    section: null,
    severity: rest.value <= rest.limit ? 'ok' : 'fail',
    quantity: 'length',
    ...rest,
    change: rest.value <= rest.limit ? '' : rest.change,
  });
  return [
    ...results.flatMap((result, index) => sectionFindings(design, result, index)),
    atLeast('spacer-proud', null, 'warn', {
      label: 'Hub against the rotor spacer',
      value: design.hubRadius,
      limit: design.spacerRadius,
      change: `The spacer stands over the hub: make the hub radius at least ${mm(design.spacerRadius)}.`,
      parameters: ['hubRadius', 'spacerRadius'],
    }),
    within('radius', {
      label: 'Furthest part from the shaft',
      value: stack.outerRadius,
      limit: design.largestRadius,
      change: `Too large by ${over(stack.outerRadius, design.largestRadius)}. ${smallerRadius(design, design.sections[widest]!, stack.sweepRadius, stack.sweepRadius - (stack.outerRadius - design.largestRadius))}`,
      parameters: ['largestRadius', 'rotorPlates', 'airGap'],
    }),
    within('depth', {
      label: 'Depth over all plates',
      value: stack.depth,
      limit: design.largestDepth,
      change: `Too deep by ${over(stack.depth, design.largestDepth)}: at this gap and sheet take at most ${Math.max(2, Math.floor((plates * design.largestDepth) / stack.depth))} plates in all, or make gap and sheet thinner.`,
      parameters: ['largestDepth', 'rotorPlates', 'airGap'],
    }),
  ];
}
