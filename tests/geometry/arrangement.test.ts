/** Arrangements other than one rotor and one stator: capacitance, plates and stack. */
import { describe, expect, test } from 'vitest';
import {
  createEdgeCache,
  defaultDesign,
  derive,
  type Derived,
  type Design,
} from '../../geometry';
import { contourArea, contourReach } from '../../geometry/measure';

const DEGREE = Math.PI / 180;
const PICO = 1e-12;
const cache = createEdgeCache();

function derived(edit: (design: Design) => void): Derived {
  const design = defaultDesign();
  design.largestRadius = 200;
  design.largestDepth = 200;
  Object.assign(design.sections[0]!, {
    law: 'capacitance',
    targetKind: 'terminals',
    minCapacitance: 40 * PICO,
    maxCapacitance: 440 * PICO,
  });
  edit(design);
  const derivation = derive(design, { cache });
  if (!derivation.ok) throw new Error(JSON.stringify(derivation.findings));
  return derivation.derived;
}

function quarterTurn(design: Design): void {
  design.arrangement = 'butterfly';
  design.travel = 90 * DEGREE;
  design.rotorSector = 85 * DEGREE;
  design.statorSector = 85 * DEGREE;
  design.postCount = 2;
}

/** What the area of the overlap alone adds from the law's beginning to its end, F. */
const areaRange = ({ sections: [section] }: Derived): number => {
  const { areaOnly, angle, from, to } = section!.law;
  return areaOnly[angle.indexOf(to)]! - areaOnly[angle.indexOf(from)]!;
};

/**
 * C = ε·n·(θ/2)·(r² − rc²)/g of sectors (textbook; NBS Circular 74 prints it for half circles), two
 * equal ones in series have half (textbook). The blade of a straight capacitance law is nearly an
 * arc; its mean square radius is taken.
 */
function sectorRange({ design, sections }: Derived, share: number): number {
  const section = sections[0]!;
  const { law, rotor, gaps } = section;
  const lobes = design.arrangement === 'butterfly' ? 2 : 1;
  const pitch = (2 * Math.PI) / lobes;
  const blade: number =
    contourArea(rotor.outside) / lobes -
    ((pitch - design.rotorSector) / 2) * design.hubRadius ** 2;
  const meanSquare: number = (2 * blade) / design.rotorSector;
  const epsilon = 8.8541878188e-15 * design.sections[0]!.permittivity;
  return (
    (share *
      epsilon *
      gaps *
      ((law.to - law.from) / 2) *
      (meanSquare - design.cutoutRadius ** 2)) /
    section.airGap
  );
}

describe.each([
  ['split-stator', 0.5, (design: Design): void => void (design.arrangement = 'split-stator')],
  ['butterfly', 0.5, quarterTurn],
  ['differential', 1, (design: Design): void => void (design.arrangement = 'differential')],
] as const)('%s', (_name: string, share: number, edit: (design: Design) => void) => {
  const result = derived(edit);
  const section = result.sections[0]!;

  test('holds its law within 0.1 % of the range, rising', () => {
    expect(section.law.largestInner.fraction).toBeLessThan(1e-3);
    expect(section.law.fallsAt).toBeNull();
  });

  test('the range by area is that of sectors, in series where two stand so', () => {
    // The blade is no exact arc: the edges' part of the law shapes it near its ends.
    expect(areaRange(result) / sectorRange(result, share)).toBeCloseTo(1, 1);
    expect(Math.abs(areaRange(result) / sectorRange(result, share) - 1)).toBeLessThan(0.02);
  });

  test('edges and plan view change what the area says by some per cent, not more', () => {
    const { achieved, angle, from, to } = section.law;
    const whole = achieved[angle.indexOf(to)]! - achieved[angle.indexOf(from)]!;
    expect(Math.abs(areaRange(result) / whole - 1)).toBeLessThan(0.06);
  });
});

test('a split stator is two sets of half the capacitance each way: as deep as two sections', () => {
  const one = derived(() => undefined);
  const two = derived((design) => (design.arrangement = 'split-stator'));
  const { rotor, stator, law } = two.sections[0]!;
  expect(rotor.quantity).toBe(2 * one.sections[0]!.rotor.quantity);
  expect(stator.quantity).toBe(2 * one.sections[0]!.stator.quantity);
  expect(two.stack.depth).toBeCloseTo(2 * one.stack.depth + two.design.sectionSpacing, 9);
  // Each set alone has twice what the two have in series: the same plates as a single of twice the range.
  const twice = derived((design) => {
    design.sections[0]!.minCapacitance = 80 * PICO;
    design.sections[0]!.maxCapacitance = 880 * PICO;
  });
  expect(rotor.area / twice.sections[0]!.rotor.area).toBeCloseTo(1, 4);
  expect(law.achieved.length).toBe(twice.sections[0]!.law.achieved.length);
});

test('a butterfly rotor is the same turned by half a turn, and two stators stand across', () => {
  const { sections, stack } = derived(quarterTurn);
  const { rotor, stator, posts, statorAngles } = sections[0]!;
  if (rotor.outside.kind !== 'path') throw new Error('a circle');
  const corners = rotor.outside.vertices.map(({ x, y }) => [x, y] as const);
  for (const [x, y] of corners) {
    expect(Math.min(...corners.map(([u, v]) => Math.hypot(u + x, v + y)))).toBeLessThan(1e-9);
  }
  expect(statorAngles).toEqual([0, Math.PI]);
  expect(posts).toHaveLength(4);
  expect(stator.quantity).toBe(30);
  expect(stack.plates.filter(({ role }) => role === 'stator')).toHaveLength(30);
  expect(contourReach(rotor.outside)).toBeCloseTo(sections[0]!.sweepRadius, 3);
});

describe('differential', () => {
  const { sections, design } = derived((d) => (d.arrangement = 'differential'));
  const { law, frame } = sections[0]!;

  test('what one stator gains the other loses: with equal steps the sum stays the same', () => {
    const inner = law.angle.flatMap((angle, i) =>
      angle > law.from + 0.3 && angle < law.to - 0.3 ? [law.achieved[i]! + law.other![i]!] : [],
    );
    const mean = inner.reduce((a, b) => a + b, 0) / inner.length;
    const range = 400 * PICO;
    for (const sum of inner) expect(Math.abs(sum - mean) / range).toBeLessThan(0.01);
  });

  test('the second stator is the first seen from the other end of the travel', () => {
    // With an even blade the two run as mirror images; the law's rests are alike up to a degree.
    const trimmer = sections[0]!.trimmer;
    const first = law.achieved.at(-1)! - trimmer;
    expect(law.other![0]! / first).toBeCloseTo(1, 1);
    expect(law.other!.at(-1)!).toBeGreaterThan(frame);
    expect(law.other!.at(-1)!).toBeLessThan(law.achieved[0]! - trimmer + 2 * PICO);
    expect(design.travel).toBe(Math.PI);
  });
});

test('two blades on a half turn are refused with what would work', () => {
  const design = defaultDesign();
  design.arrangement = 'butterfly';
  const derivation = derive(design, { cache });
  expect(derivation.ok).toBe(false);
  const turns = derivation.ok ? [] : derivation.findings.filter(({ code }) => code === 'turn');
  expect(turns.map(({ label }) => label)).toContain(
    'Rotor and stator sector together, with two blades',
  );
});

describe('film and disc', () => {
  test('layers in series: the area term is that of the gap they stand for (textbook)', () => {
    // 0.2 mm of 2.1 in 0.5 mm: 0.3 mm of air and 0.2/2.1 mm.
    const { sections } = derived((design) => {
      Object.assign(design.sections[0]!, {
        dielectric: 'film',
        filmThickness: 0.2,
        filmPermittivity: 2.1,
        permittivity: 1,
      });
    });
    expect(sections[0]!.electricalGap).toBeCloseTo(0.3 + 0.2 / 2.1, 12);
    expect(sections[0]!.law.largestInner.fraction).toBeLessThan(1e-3);
  });

  test('a disc lies between one rotor and one stator plate', () => {
    const design = defaultDesign();
    design.sections[0]!.dielectric = 'disc';
    const derivation = derive(design, { cache });
    expect(derivation.ok).toBe(false);
    if (derivation.ok) return;
    expect(derivation.findings.map(({ label }) => label)).toContain(
      'One rotor and one stator plate on the disc',
    );
  });

  test('a film as thick as its gap is refused', () => {
    const design = defaultDesign();
    Object.assign(design.sections[0]!, { dielectric: 'film', filmThickness: 0.5 });
    const derivation = derive(design, { cache });
    expect(derivation.ok).toBe(false);
  });
});
