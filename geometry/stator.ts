/** The stator plate: a sector with a cut-out round the shaft and an ear for each post. */

import type { Arrangement } from './arrangement';
import { bladeRadius, bladeSlope, type Blade } from './blade';
import type { Design, Section } from './design';
import { withEar, type Chain, type EarShape } from './ear';
import { fitArcs, type CurveSamples } from './fit-arcs';
import type { Circle, Path } from './outline';
import { arcVertices, polar } from './polar';
import { FIT_AT_SAMPLES } from './tolerances';

export type StatorForm = 'even' | 'following';

/**
 * The form a section's stator takes: laws that begin slowly want a small far side. Where the rotor
 * passes from one stator into another, its longest radius sweeps all of both.
 */
export function statorFormOf(
  { statorForm, law }: Section,
  { passesOn }: Arrangement,
): StatorForm {
  if (passesOn) return 'even';
  if (statorForm !== 'by-law') return statorForm;
  return law === 'capacitance' ? 'even' : 'following';
}

/** Overhang along the radius, in overhangs, where the curve is steepest. */
const STEEPEST = 3;

/** Outer radius of the stator at an angle from its first radial line. */
export type StatorRadius = (angle: number) => number;

/**
 * @param form even: the longest rotor radius and the overhang all round; following: at each
 *   angle the longest radius that ever passes there, and the overhang
 */
export function statorRadius(form: StatorForm, blade: Blade, overhang: number): StatorRadius {
  const longest = Float64Array.from(blade.radius);
  for (let i = 1; i < longest.length; i++) longest[i] = Math.max(longest[i]!, longest[i - 1]!);
  const last = longest[longest.length - 1]!;
  if (form === 'even') return () => last + overhang;
  // The overhang is measured across the edge: along the radius it is longer where r changes.
  const slope = bladeSlope({ sector: blade.sector, radius: longest });
  const radius = longest.map(
    (r, i) => r + overhang * Math.min(STEEPEST, Math.hypot(1, slope[i]! / r)),
  );
  const reaching: Blade = { sector: blade.sector, radius };
  return (angle) => bladeRadius(reaching, blade.sector - angle);
}

/** Angle of a straight edge that is set in by an offset, at a radius; rad from its radial line. */
function setIn(offset: number, radius: number): number {
  return Math.asin(Math.min(1, Math.max(-1, offset / radius)));
}

/** Angles at which the outer edge begins and ends. */
function outerEnds(design: Design, radiusAt: StatorRadius): [number, number] {
  const { statorSector, statorEdgeOffset } = design;
  let from = 0;
  let to = statorSector;
  for (let pass = 0; pass < 6; pass++) {
    from = setIn(statorEdgeOffset, radiusAt(from));
    to = statorSector - setIn(statorEdgeOffset, radiusAt(to));
  }
  return [from, to];
}

const SAMPLES = 240;

/** The outer edge, sampled counter-clockwise with its tangents. */
function outerSamples(radiusAt: StatorRadius, from: number, to: number): CurveSamples {
  const count = SAMPLES + 1;
  const [x, y, tx, ty] = [0, 1, 2, 3].map(() => new Float64Array(count)) as [
    Float64Array,
    Float64Array,
    Float64Array,
    Float64Array,
  ];
  const step = (to - from) / SAMPLES;
  for (let i = 0; i < count; i++) {
    const angle = from + i * step;
    const r = radiusAt(angle);
    const low = Math.max(from, angle - step);
    const high = Math.min(to, angle + step);
    const dr = (radiusAt(high) - radiusAt(low)) / (high - low);
    const length = Math.hypot(r, dr);
    x[i] = r * Math.cos(angle);
    y[i] = r * Math.sin(angle);
    tx[i] = (dr * Math.cos(angle) - r * Math.sin(angle)) / length;
    ty[i] = (dr * Math.sin(angle) + r * Math.cos(angle)) / length;
  }
  return { x, y, tx, ty };
}

export interface StatorOutline {
  readonly outside: Path;
  readonly holes: readonly Circle[];
  /** Largest distance of the arcs from the samples of the outer edge, mm. */
  readonly fitDeviation: number;
}

/** The stator plate where it stands, or null where an ear reaches over one of its edges. */
export function statorOutline(
  design: Design,
  ears: readonly EarShape[],
  radiusAt: StatorRadius,
): StatorOutline | null {
  const { cutoutRadius, statorSector, statorEdgeOffset } = design;
  const [from, to] = outerEnds(design, radiusAt);
  const fitted = fitArcs(outerSamples(radiusAt, from, to), FIT_AT_SAMPLES);
  let outer: Chain | null = [...fitted.vertices, { ...polar(radiusAt(to), to), bulge: 0 }];
  for (const ear of ears) {
    outer = outer && withEar(outer, ear);
    if (!outer) return null;
  }
  const inwards = setIn(statorEdgeOffset, cutoutRadius);
  const sweep = statorSector - 2 * inwards;
  return {
    outside: {
      kind: 'path',
      vertices: [
        ...outer,
        ...arcVertices(cutoutRadius, statorSector - inwards, -sweep),
        { ...polar(cutoutRadius, inwards), bulge: 0 },
      ],
    },
    holes: ears.map(({ angle, circleRadius }) => ({
      kind: 'circle',
      ...polar(circleRadius, angle),
      radius: design.postHoleDiameter / 2,
    })),
    fitDeviation: fitted.deviation,
  };
}
