import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
  createEdgeCache,
  derive,
  defaultDesign,
  defaultSection,
  type Derivation,
  type Derived,
  type Design,
} from '../../geometry';
import { cutFiles } from '../../geometry/files';
import { contourArea } from '../../geometry/measure';
import { anyDesign, buildableDesign, designNear } from '../support/any-design';

const SEED = 20261201;

/** Solved edges, kept over all tests. */
const cache = createEdgeCache();

function everyNumber(
  value: unknown,
  path: string,
  visit: (n: number, path: string) => void,
): void {
  if (typeof value === 'number') visit(value, path);
  else if (typeof value === 'object' && value !== null) {
    for (const [key, inner] of Object.entries(value))
      everyNumber(inner, `${path}.${key}`, visit);
  }
}

function expectFinite(derivation: Derivation): void {
  everyNumber(derivation, 'derivation', (n, path) => {
    if (!Number.isFinite(n)) throw new Error(`${path} is ${n}`);
  });
}

function expectSound(derived: Derived): void {
  for (const section of derived.sections) {
    for (const plate of [section.rotor, section.stator]) {
      expect(contourArea(plate.outside)).toBeGreaterThan(0);
      expect(plate.area).toBeGreaterThan(0);
    }
    expect(section.narrowestBlade).toBeGreaterThan(0);
    expect(section.law.achieved).toHaveLength(section.law.angle.length);
  }
}

function fail(derivation: Derivation): never {
  throw new Error(JSON.stringify(derivation).slice(0, 400));
}

/** Derives and checks what must always hold; tells whether plates came out. */
function expectAnswer(design: Design): boolean {
  const derivation = derive(design, { cache, model: 'edges' });
  expectFinite(derivation);
  if (derivation.ok) {
    expectSound(derivation.derived);
    return true;
  }
  // Where there are no plates something must say what to change.
  expect(derivation.findings.some((f) => f.severity === 'fail' && f.change !== '')).toBe(true);
  return false;
}

test(
  `no design of the parameter table breaks the kernel (seed ${SEED})`,
  { timeout: 120_000 },
  () => {
    fc.assert(
      fc.property(anyDesign, (design) => {
        expectAnswer(design);
      }),
      { seed: SEED, numRuns: 1500, endOnFailure: true },
    );
  },
);

test(
  `nor does any design that a builder might mean (seed ${SEED})`,
  { timeout: 120_000 },
  () => {
    let plates = 0;
    fc.assert(
      fc.property(buildableDesign, (design) => {
        if (expectAnswer(design)) plates++;
      }),
      { seed: SEED, numRuns: 80, endOnFailure: true },
    );
    expect(plates).toBeGreaterThan(25);
  },
);

test(
  `designs near the default hold their law and write files (seed ${SEED})`,
  { timeout: 120_000 },
  () => {
    let plates = 0;
    fc.assert(
      fc.property(designNear(defaultDesign()), (design) => {
        const derivation = derive(design);
        expectFinite(derivation);
        if (!derivation.ok) return;
        plates++;
        const { derived } = derivation;
        expectSound(derived);
        for (const section of derived.sections) {
          expect(section.law.fallsAt).toBeNull();
          expect(section.rotor.fitDeviation).toBeLessThanOrEqual(0.005);
        }
        for (const file of cutFiles('any', derived)) {
          expect(file.text).not.toMatch(/NaN|Infinity|undefined/);
        }
      }),
      { seed: SEED, numRuns: 40, endOnFailure: true },
    );
    expect(plates).toBeGreaterThan(10);
  },
);

describe('the default design', () => {
  const derivation = derive(defaultDesign());
  const derived = derivation.ok ? derivation.derived : fail(derivation);

  test('can be cut as it stands', () => {
    expect(derived.findings.filter((finding) => finding.severity !== 'ok')).toEqual([]);
  });

  test('gives the same plates every time', () => {
    expect(derive(defaultDesign())).toEqual(derivation);
  });

  test('crosses a worker border as it is', () => {
    expect(structuredClone(derived)).toEqual(derived);
    expect(JSON.parse(JSON.stringify(derived))).toEqual(derived);
  });

  test('stacks with the gap on both sides of every plate', () => {
    const { plates, spacers, depth } = derived.stack;
    const { airGap } = derived.design.sections[0]!;
    plates.slice(1).forEach((plate, i) => {
      const below = plates[i]!;
      expect(plate.role).not.toBe(below.role);
      const gap = plate.z - plate.thickness / 2 - (below.z + below.thickness / 2);
      expect(gap).toBeCloseTo(airGap, 12);
    });
    // Rotor spacer = 2g + ts = 1.8 mm; the stack is 29 sheets and 28 gaps deep.
    for (const spacer of spacers) expect(spacer.length).toBeCloseTo(1.8, 12);
    expect(depth).toBeCloseTo(29 * 0.8 + 28 * 0.5, 9);
  });
});

test('four sections stand one behind the other on one shaft', () => {
  const design = defaultDesign();
  design.sections = [1, 2, 3, 4].map((k) => ({ ...defaultSection(), airGap: 0.4 + 0.05 * k }));
  design.largestDepth = 300;
  design.largestRadius = 120;
  const derivation = derive(design);
  if (!derivation.ok) fail(derivation);
  const { stack, sections } = derivation.derived;
  expect(sections).toHaveLength(4);
  const first = (section: number) => stack.plates.find((plate) => plate.section === section)!;
  const last = (section: number) =>
    stack.plates.findLast((plate) => plate.section === section)!;
  for (const section of [1, 2, 3]) {
    const clear =
      first(section).z -
      first(section).thickness / 2 -
      (last(section - 1).z + last(section - 1).thickness / 2);
    expect(clear).toBeCloseTo(design.sectionSpacing, 9);
  }
});

describe('what cannot be made says what to change', () => {
  const refused = (change: (design: ReturnType<typeof defaultDesign>) => void) => {
    const design = defaultDesign();
    change(design);
    const derivation = derive(design);
    if (derivation.ok) throw new Error('plates came out');
    return derivation.findings[0]!;
  };

  test('stray above the total at the high end', () => {
    const finding = refused((d) => (d.sections[0]!.stray = 60e-12));
    expect(finding.code).toBe('range-infeasible');
    expect(finding.value).toBe(60e-12);
    expect(finding.limit * 1e12).toBeCloseTo(36.52, 2);
    expect(finding.parameters).toContain('stray');
  });

  test('a band upside down', () => {
    expect(refused((d) => (d.sections[0]!.bandHigh = 400e3)).code).toBe('range-infeasible');
  });

  test('more plates than the law can bear: the count it names works', () => {
    const many = (d: ReturnType<typeof defaultDesign>): void => {
      d.sections[0]!.rotorPlates = 60;
      d.sections[0]!.statorPlates = 61;
    };
    const finding = refused(many);
    expect(finding.code).toBe('outline-infeasible');
    const most = Number(/take (\d+) plates in all/.exec(finding.change)![1]);
    const withPlates = (plates: number): Derivation => {
      const design = defaultDesign();
      design.sections[0]!.rotorPlates = Math.floor(plates / 2);
      design.sections[0]!.statorPlates = plates - Math.floor(plates / 2);
      return derive(design);
    };
    expect(withPlates(most).ok).toBe(true);
    expect(withPlates(Math.ceil(1.3 * most)).ok).toBe(false);
  });

  test('plates that do not alternate', () => {
    expect(refused((d) => (d.sections[0]!.statorPlates = 20)).code).toBe('plate-counts');
  });

  test('hub in the cut-out', () => {
    expect(refused((d) => (d.hubRadius = 9.5)).code).toBe('cutout-clearance');
  });
});

describe('findings on plates that can be cut', () => {
  const finding = (
    code: string,
    change: (design: ReturnType<typeof defaultDesign>) => void,
  ) => {
    const design = defaultDesign();
    change(design);
    const derivation = derive(design);
    if (!derivation.ok) fail(derivation);
    return derivation.derived.findings.filter((f) => f.code === code && f.severity !== 'ok');
  };

  test('radius: the plate count it names fits', () => {
    const [over] = finding('radius', (d) => (d.largestRadius = 52));
    expect(over!.severity).toBe('fail');
    const plates = Number(/about (\d+) plates/.exec(over!.change)![1]);
    const fits = finding('radius', (d) => {
      d.largestRadius = 52;
      d.sections[0]!.rotorPlates = Math.ceil(plates / 2);
      d.sections[0]!.statorPlates = Math.ceil(plates / 2);
    });
    expect(fits).toEqual([]);
  });

  test('depth', () => {
    const [over] = finding('depth', (d) => (d.largestDepth = 30));
    expect(over!.value).toBeCloseTo(37.2, 9);
    expect(over!.limit).toBe(30);
  });

  test('voltage: a caution above practice, a failure above breakdown', () => {
    expect(
      finding('gap-voltage', (d) => (d.sections[0]!.workingVoltage = 800))[0]!.severity,
    ).toBe('warn');
    expect(
      finding('gap-voltage', (d) => (d.sections[0]!.workingVoltage = 3000))[0]!.severity,
    ).toBe('fail');
  });

  test('a post in the sweep of the rotor is a hit', () => {
    const [hit] = finding('post-clearance', (d) => (d.postCircleRadius = 30));
    expect(hit!.severity).toBe('fail');
    expect(hit!.value).toBeLessThan(0);
  });

  test('thin hub, thin web, small hole, narrow overhang', () => {
    expect(finding('web-thin', (d) => (d.hubRadius = 3.5))).toHaveLength(1);
    expect(finding('web-thin', (d) => (d.postWeb = 0.5))).toHaveLength(1);
    expect(finding('overhang-short', (d) => (d.overhang = 1))).toHaveLength(1);
    const holes = finding('hole-small', (d) => {
      d.sections[0]!.statorThickness = 4;
      d.largestDepth = 200;
    });
    expect(holes).toHaveLength(1);
  });
});
