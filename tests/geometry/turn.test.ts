/** Travels other than half a turn, rests, set-in edges and both senses of turning. */
import { describe, expect, test } from 'vitest';
import {
  createEdgeCache,
  derive,
  defaultDesign,
  type Derived,
  type Design,
  type Path,
} from '../../geometry';
import { contourArea } from '../../geometry/measure';

const DEGREE = Math.PI / 180;
const cache = createEdgeCache();

function derived(change: (design: Design) => void): Derived {
  const design = defaultDesign();
  Object.assign(design, { postCount: 2, largestRadius: 120 });
  Object.assign(design.sections[0]!, {
    targetKind: 'terminals',
    minCapacitance: 30e-12,
    maxCapacitance: 150e-12,
  });
  change(design);
  const derivation = derive(design, { cache });
  if (!derivation.ok) throw new Error(derivation.findings.map((f) => f.change).join());
  return derivation.derived;
}

describe.each([
  [60, 54, 54, 'capacitance'],
  [90, 84, 84, 'wavelength'],
  [120, 112, 112, 'frequency'],
  [270, 262, 80, 'wavelength'],
  [300, 290, 50, 'frequency'],
] as const)('%i° of travel, rotor %i°, stator %i°', (travel, rotor, stator, law) => {
  const { sections, turn } = derived((design) => {
    design.travel = travel * DEGREE;
    design.rotorSector = rotor * DEGREE;
    design.statorSector = stator * DEGREE;
    design.sections[0]!.law = law;
  });

  test('the law takes most of the travel and is held within 0.1 % of the range', () => {
    expect((turn.lawTo - turn.lawFrom) / turn.travel).toBeGreaterThan(0.6);
    expect(sections[0]!.law.largestInner.fraction).toBeLessThan(1e-3);
    expect(sections[0]!.law.fallsAt).toBeNull();
  });
});

test('rests can be set', () => {
  const { turn } = derived((design) => {
    design.openRest = 30 * DEGREE;
    design.meshedRest = 12 * DEGREE;
  });
  expect(turn.lawFrom).toBeCloseTo(30 * DEGREE, 12);
  expect(turn.lawTo).toBeCloseTo(168 * DEGREE, 12);
});

// Up to six gaps in and two out.
test.each([
  ['frequency', 1],
  ['frequency', 2],
  ['logarithmic', 1],
  ['logarithmic', 3],
  ['wavelength', 1],
  ['wavelength', -1],
] as const)('law %s, stator edges set in by %f mm: the law is held', (law, offset) => {
  const { sections } = derived((design) => {
    design.statorEdgeOffset = offset;
    design.sections[0]!.law = law;
  });
  expect(sections[0]!.law.largestInner.fraction).toBeLessThan(1e-3);
});

test.each(['capacitance', 'wavelength', 'frequency', 'logarithmic'] as const)(
  'law %s with everything else as a new design has it: held, and nothing fails',
  (law) => {
    const { sections, findings } = derived((design) => (design.sections[0]!.law = law));
    expect(sections[0]!.law.largestInner.fraction).toBeLessThan(1e-3);
    expect(sections[0]!.law.fallsAt).toBeNull();
    expect(findings.filter(({ severity }) => severity === 'fail')).toEqual([]);
  },
);

test('clockwise plates are the anticlockwise ones, mirrored', () => {
  const one = derived(() => undefined);
  const other = derived((design) => (design.sense = 'clockwise'));
  expect(other.turn.direction).toBe(-1);
  for (const role of ['rotor', 'stator'] as const) {
    const a = one.sections[0]![role];
    const b = other.sections[0]![role];
    expect(contourArea(b.outside)).toBeCloseTo(contourArea(a.outside), 9);
    const corner = (path: Path, y: number): string[] =>
      path.vertices.map((v) => `${v.x.toFixed(6)} ${(y * v.y + 0).toFixed(6)}`).sort();
    const plain = (corners: string[]): string[] =>
      corners.map((c) => c.replace('-0.000000', '0.000000'));
    expect(plain(corner(b.outside as Path, 1)).sort()).toEqual(
      plain(corner(a.outside as Path, -1)).sort(),
    );
  }
  expect(other.sections[0]!.law).toEqual(one.sections[0]!.law);
});

test.each([
  [
    'travel and stator overlap at the open stop',
    (d: Design) => (d.statorSector = 190 * DEGREE),
    'statorSector',
  ],
  [
    'rests leave no law',
    (d: Design) => Object.assign(d, { openRest: 2, meshedRest: 1.2 }),
    'openRest',
  ],
  ['the law begins before the stator', (d: Design) => (d.openRest = 0), 'openRest'],
])('%s: refused, with what to change', (_what, change, key) => {
  const design = defaultDesign();
  change(design);
  const derivation = derive(design, { cache });
  if (derivation.ok) throw new Error('plates came out');
  const finding = derivation.findings[0]!;
  expect(finding.code).toBe('turn');
  expect(finding.parameters).toContain(key);
  expect(finding.change).not.toBe('');
});
