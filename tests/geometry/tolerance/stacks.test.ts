import { describe, expect, test } from 'vitest';
import {
  createEdgeCache,
  defaultDesign,
  derive,
  type Derived,
  type Design,
} from '../../../geometry';
import { bladeSlope } from '../../../geometry/blade';
import { EPSILON_0 } from '../../../geometry/constants';
import { gapCapacitance } from '../../../geometry/field/cell-field';
import { overlapAt } from '../../../geometry/overlap';
import { bladeOf } from '../../../geometry/rotor';
import { platesOf, settingOf } from '../../../geometry/setting';
import { BLADE_STEPS } from '../../../geometry/solve-blade';
import { drawWith, randomFrom } from '../../../geometry/tolerance/random';
import { responseOf, type Response } from '../../../geometry/tolerance/response';
import {
  stackByChance,
  stacksByChance,
  tiltFactor,
  type Outcome,
} from '../../../geometry/tolerance/stacks';
import {
  startingTolerances,
  toleranceNames,
  type ToleranceName,
  type Tolerances,
} from '../../../geometry/tolerance/tolerances';

const cache = createEdgeCache();

function derived(edit: (design: Design) => void = () => undefined): Derived {
  const design = defaultDesign();
  edit(design);
  const derivation = derive(design, { cache });
  if (!derivation.ok) throw new Error(JSON.stringify(derivation.findings));
  return derivation.derived;
}

const plates = derived();
const response = responseOf(plates, 0);

const only = (name: ToleranceName | null, amount: number): Tolerances =>
  Object.fromEntries(
    toleranceNames.map((other) => [
      other,
      { ...startingTolerances[other], amount: other === name ? amount : 0 },
    ]),
  ) as unknown as Tolerances;

/** Always the end of the tolerance, so that one knows what was drawn. */
const atTheEnd = (tolerance: number): number => tolerance;

function outcome(tolerances: Tolerances, limit = 0.01, seed = 7, stacks = 400): Outcome {
  const run = stacksByChance(response, tolerances, { stacks, seed, limit });
  let step = run.next();
  while (!step.done) step = run.next();
  return step.value;
}

test('without tolerances every stack is the nominal one', () => {
  const stack = stackByChance(response, only(null, 0), atTheEnd);
  stack.forEach((value, i) => expect(value / response.nominal[i]!).toBeCloseTo(1, 12));
});

// Rotor off centre by δ·g: C × 1/(1 − δ²): 0.1 1.0101010; 0.2 1.0416667; 0.3 1.0989011 (computed).
test.each([
  [0.1, 1.010101],
  [0.2, 1.0416667],
  [0.3, 1.0989011],
])('off centre by %f of the gap the area term grows %f times', (share, factor) => {
  const stack = stackByChance(response, only('centring', share * response.gap), atTheEnd);
  stack.forEach((value, i) => {
    const area = (response.area[i]! * response.gaps) / response.gap;
    expect((value - response.nominal[i]!) / area + 1).toBeCloseTo(factor, 6);
  });
});

// Tilted by ±x·g across the plate: × atanh(x)/x: 0.1 1.00335348; 0.3 1.03173201 (computed).
test.each([
  [0.1, 1.00335348],
  [0.3, 1.03173201],
])('tilted by %f of the gap: %f times', (x, factor) => {
  expect(tiltFactor(x)).toBeCloseTo(factor, 8);
});

test('the same seed gives the same stacks, another one others', () => {
  expect(outcome(startingTolerances)).toEqual(outcome(startingTolerances));
  expect(outcome(startingTolerances, 0.01, 8).aligned).not.toEqual(
    outcome(startingTolerances).aligned,
  );
});

test('a wider limit passes more stacks; the alignment leaves nothing at the law’s beginning', () => {
  const yields = [0.002, 0.005, 0.01, 0.05].map(
    (limit) => outcome(startingTolerances, limit).yield,
  );
  expect([...yields].sort((a, b) => a - b)).toEqual(yields);
  const { aligned, asBuilt } = outcome(startingTolerances);
  expect([aligned.low[0], aligned.high[0]]).toEqual([0, 0]);
  asBuilt.low.forEach((low, i) => expect(low).toBeLessThanOrEqual(asBuilt.high[i]!));
});

describe('draws', () => {
  test.each(['normal', 'even'] as const)('%s stay within the tolerance, about 0', (spread) => {
    const draw = drawWith(randomFrom(3));
    const values = Array.from({ length: 20000 }, () => draw(0.2, spread));
    expect(Math.max(...values.map(Math.abs))).toBeLessThanOrEqual(0.2);
    expect(Math.abs(values.reduce((a, b) => a + b, 0) / values.length)).toBeLessThan(0.002);
    // σ = t/√3 evenly; a normal one cut at 2σ has 0.88 of its own σ = t/2 (textbook).
    const sigma = Math.sqrt(values.reduce((a, b) => a + b * b, 0) / values.length);
    expect(sigma / 0.2).toBeCloseTo(spread === 'even' ? 1 / Math.sqrt(3) : 0.5 * 0.8796, 2);
  });
});

/** All that the field model has in the gaps, edges alone, for a changed section and outline. */
function byTheModel(change: { airGap?: number; grow?: number }): number[] {
  const { design, turn, sections } = plates;
  const section = { ...design.sections[0]!, airGap: change.airGap ?? 0.5 };
  const { rotor, stator } = sections[0]!;
  if (rotor.outside.kind !== 'path') throw new Error('a circle');
  const blade = bladeOf(rotor.outside, design.rotorSector, BLADE_STEPS);
  // Outwards across the edge, which is more along the radius where the radius changes.
  const slope = bladeSlope(blade);
  const grown = {
    ...blade,
    radius: blade.radius.map((r, i) => r + (change.grow ?? 0) * Math.hypot(1, slope[i]! / r)),
  };
  const setting = settingOf(design, turn, section, cache);
  const mesh = response.angle.map((angle) => angle + turn.meshAtOpen);
  const outside = {
    kind: 'path' as const,
    vertices: [
      ...Array.from({ length: BLADE_STEPS + 1 }, (_, k) => {
        const i = BLADE_STEPS - k;
        const phi = (design.rotorSector * i) / BLADE_STEPS;
        const r = grown.radius[i]!;
        return { x: r * Math.cos(phi), y: -r * Math.sin(phi), bulge: 0 };
      }),
      { x: 0, y: 0, bulge: 0 },
    ],
  };
  const overlaps = overlapAt({ outside }, stator, mesh, {
    cutoutRadius: design.cutoutRadius,
    blade: grown,
  });
  const scale = EPSILON_0 * section.permittivity * setting.gaps;
  const own = platesOf(setting, grown);
  return overlaps.map(
    (overlap, i) => scale * gapCapacitance(setting.edges, own, null, overlap, mesh[i]!),
  );
}

const nominalByModel = byTheModel({});

function deviation(predicted: (response: Response) => number[], changed: number[]): number {
  const stack = predicted(response);
  return Math.max(
    ...stack.map((value, i) => {
      const expected = changed[i]! - nominalByModel[i]!;
      return Math.abs(value - response.nominal[i]! - expected) / response.range;
    }),
  );
}

describe('against the field model evaluated anew for the changed plates', () => {
  test.each([-0.05, -0.02, 0.02, 0.05])(
    'all gaps %f mm wider: within 0.1 % of the range',
    (change) => {
      // Every spacer longer by twice the change, seen alike by both stacks: rebuilt by hand.
      const width = 0.5 + change;
      const predicted = (r: Response): number[] =>
        r.nominal.map(
          (value, i) =>
            value +
            r.area[i]! * r.gaps * (1 / width - 1 / r.gap) +
            r.restPerGap[i]! * r.gaps * change,
        );
      expect(deviation(predicted, byTheModel({ airGap: width }))).toBeLessThan(1e-3);
    },
  );

  test.each([-0.1, 0.1])('rotor edge %f mm further out: within 0.1 % of the range', (grow) => {
    const predicted = (r: Response): number[] =>
      stackByChance(r, only('outline', grow), atTheEnd);
    expect(deviation(predicted, byTheModel({ grow }))).toBeLessThan(1e-3);
  });
});
