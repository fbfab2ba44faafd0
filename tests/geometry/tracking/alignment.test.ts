/** The alignment of the worked pair, and what its trimmers must reach. */
import { readFileSync } from 'node:fs';
import { beforeAll, describe, expect, it } from 'vitest';
import {
  checkDesign,
  createEdgeCache,
  defaultDesign,
  derive,
  type Derived,
} from '../../../geometry';
import { resonantFrequency } from '../../../geometry/resonance';
import { responseOf } from '../../../geometry/tolerance/response';
import { stacksByChance, type Outcome } from '../../../geometry/tolerance/stacks';
import { startingTolerances, toleranceNames } from '../../../geometry/tolerance/tolerances';
import { alignmentOf, type AlignmentStep } from '../../../geometry/tracking/alignment';
import { trimmerRange } from '../../../geometry/tracking/trimmer-range';

let pair: Derived;
beforeAll(() => {
  const url = new URL('../../../public/examples/tracked-pair.json', import.meta.url);
  const { design } = JSON.parse(readFileSync(url, 'utf8')) as { design: unknown };
  const result = derive(checkDesign(design), { model: 'edges', cache: createEdgeCache() });
  if (!result.ok) throw new Error(result.findings.map(({ change }) => change).join());
  pair = result.derived;
});

describe('alignment', () => {
  let steps: readonly AlignmentStep[];
  beforeAll(() => {
    steps = alignmentOf(pair)!;
  });

  it('sets the pointer, the oscillator and then the signal circuit, and tries the middle', () => {
    expect(steps.map(({ section, adjust }) => [section, adjust])).toEqual([
      [null, 'pointer'],
      [1, 'coil'],
      [1, 'trimmer'],
      [1, 'none'],
      [0, 'coil'],
      [0, 'trimmer'],
      [0, 'none'],
      [null, 'none'],
    ]);
    expect(steps.map(({ order }) => order)).toEqual([1, 2, 3, 4, 5, 6, 7, 8]);
  });

  it('stands at marks where section 1 really is tuned to what they say', () => {
    const { law, inductance } = pair.sections[0]!;
    for (const { signal, angle } of steps) {
      if (signal === null) continue;
      const after = law.angle.findIndex((at) => at >= angle);
      const [a, b] = [law.angle[after - 1]!, law.angle[after]!];
      const share = (angle - a) / (b - a);
      const total = law.achieved[after - 1]! * (1 - share) + law.achieved[after]! * share;
      expect(resonantFrequency(total, inductance!) / signal).toBeCloseTo(1, 3);
    }
  });

  it('works at the signal and the intermediate frequency above it', () => {
    const [, coil, trimmer] = steps;
    expect(coil!.circuit! - coil!.signal!).toBeCloseTo(455e3, 6);
    expect(trimmer!.signal!).toBeGreaterThan(coil!.signal!);
    expect(trimmer!.angle).toBeLessThan(coil!.angle);
    expect(trimmer!.words).toMatch(/^Dial and generator at 1\d00 kHz .* trimmer of section 2/);
    expect(steps.at(-1)!.left).not.toBeNull();
  });

  it('of a section without a coil has no marks', () => {
    const design = defaultDesign();
    design.sections[0]!.targetKind = 'terminals';
    const result = derive(design, { model: 'edges' });
    if (!result.ok) throw new Error('no plates');
    expect(alignmentOf(result.derived)).toBeNull();
  });
});

describe('the trimmer', () => {
  const outcomeWith = (factor: number): Outcome => {
    const tolerances = Object.fromEntries(
      toleranceNames.map((name) => [
        name,
        { ...startingTolerances[name], amount: factor * startingTolerances[name].amount },
      ]),
    ) as unknown as typeof startingTolerances;
    const run = stacksByChance(responseOf(pair, 1), tolerances, {
      stacks: 300,
      seed: 11,
      limit: 0.01,
    });
    for (;;) {
      const next = run.next();
      if (next.done) return next.value;
    }
  };

  it('without any tolerance has to be what it is with plates as drawn', () => {
    const { nominal, least, most } = trimmerRange(pair, 1, outcomeWith(0));
    expect(nominal).toBeGreaterThan(0);
    expect(least / nominal).toBeCloseTo(1, 6);
    expect(most / nominal).toBeCloseTo(1, 6);
  });

  it('holds what 90 of 100 stacks need, and more with wider tolerances', () => {
    const [one, two] = [1, 2].map((factor) => trimmerRange(pair, 1, outcomeWith(factor)));
    expect(one!.least).toBeLessThan(one!.nominal);
    expect(one!.most).toBeGreaterThan(one!.nominal);
    expect(two!.most - two!.least).toBeGreaterThan(1.3 * (one!.most - one!.least));
  });

  it('says how much the circuit has too much of', () => {
    const asBuilt = { angle: [0], low: [-1e-12], middle: [3e-12], high: [50e-12] };
    const range = trimmerRange(pair, 1, { asBuilt }, 0);
    expect(range.least).toBe(0);
    expect(range.missing).toBeCloseTo(50e-12 - range.nominal, 18);
    expect(range.most).toBeCloseTo(range.nominal + 1e-12, 18);
  });
});
