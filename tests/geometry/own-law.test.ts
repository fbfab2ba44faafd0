/** Laws of one's own: tables and formulas, from what is typed to the finished plates. */
import { describe, expect, test } from 'vitest';
import {
  createEdgeCache,
  defaultDesign,
  derive,
  type Derivation,
  type Design,
  type Finding,
} from '../../geometry';
import { readFormula } from '../../geometry/formula';
import { resonantFrequency } from '../../geometry/resonance';

const DEGREE = Math.PI / 180;
const PICO = 1e-12;
const cache = createEdgeCache();

function derivation(edit: (section: Design['sections'][number]) => void): Derivation {
  const design = defaultDesign();
  design.largestRadius = 120;
  edit(design.sections[0]!);
  return derive(design, { cache });
}

function plates(edit: (section: Design['sections'][number]) => void) {
  const result = derivation(edit);
  if (!result.ok) throw new Error(JSON.stringify(result.findings));
  return result.derived.sections[0]!;
}

/** Capacitance of the finished plates at a fraction of the law. */
function achievedAt({ law }: ReturnType<typeof plates>, fraction: number): number {
  const angle = law.from + fraction * (law.to - law.from);
  const after = law.angle.findIndex((a) => a >= angle - 1e-12);
  const before = Math.max(0, after - 1);
  const span = law.angle[after]! - law.angle[before]!;
  const t = span === 0 ? 0 : (angle - law.angle[before]!) / span;
  return law.achieved[before]! + t * (law.achieved[after]! - law.achieved[before]!);
}

describe('a table of angle and capacitance', () => {
  const rows: [number, number][] = [
    [0, 45],
    [30, 70],
    [60, 112],
    [90, 168],
    [120, 232],
    [150, 305],
    [180, 390],
  ];
  const section = plates((s) => {
    s.law = 'points';
    s.targetKind = 'terminals';
    s.lawPoints = rows.map(([angle, c]) => [angle * DEGREE, c * PICO]);
  });

  test.each(rows)(
    'the finished plates have at %f° their %f pF, within 0.1 % of the range',
    (angle, c) => {
      expect(Math.abs(achievedAt(section, angle / 180) / PICO - c) / 345).toBeLessThan(0.001);
    },
  );

  test('the law is held within 0.1 % of the range', () => {
    expect(section.law.largestInner.fraction).toBeLessThan(1e-3);
    expect(section.law.fallsAt).toBeNull();
  });

  test('the range is that of its ends', () => {
    expect(section.totalMin / PICO).toBeCloseTo(45, 9);
    expect(section.totalMax / PICO).toBeCloseTo(390, 9);
  });
});

test.each([
  [
    'bent upwards',
    [
      [0, 45],
      [90, 100],
      [180, 390],
    ],
  ],
  [
    'bent downwards',
    [
      [0, 45],
      [90, 330],
      [180, 390],
    ],
  ],
  [
    'rounded to a tenth of a picofarad',
    Array.from({ length: 91 }, (_, i) => [
      2 * i,
      Math.round(10 * (45 + 200 * (i / 90) + 145 * (i / 90) ** 2)) / 10,
    ]),
  ],
] as [string, [number, number][]][])('few rows, or rough ones: %s', (_, rows) => {
  const section = plates((s) => {
    s.law = 'points';
    s.targetKind = 'terminals';
    s.lawPoints = rows.map(([angle, c]) => [angle * DEGREE, c * PICO]);
  });
  for (const [angle, c] of rows) {
    const error = (achievedAt(section, angle / 180) / PICO - c) / 345;
    expect(Math.abs(error), `at ${angle}°`).toBeLessThan(0.001);
  }
});

describe('what is said of a table', () => {
  const findingOf = (code: Finding['code'], rows: [number, number][]) => {
    const result = derivation((s) => {
      s.law = 'points';
      s.targetKind = 'terminals';
      s.lawPoints = rows.map(([angle, c]) => [angle * DEGREE, c * PICO]);
    });
    if (!result.ok) throw new Error(JSON.stringify(result.findings));
    return result.derived.findings.find((finding) => finding.code === code)!;
  };
  const straight: [number, number][] = [
    [0, 45],
    [80, 205],
    [160, 365],
  ];

  test('that it is stretched to the law, and the travel that keeps its angles', () => {
    const stretched = findingOf('table-span', straight);
    expect(stretched.severity).toBe('warn');
    const law = stretched.limit / DEGREE;
    const fitting = straight.map(([angle, c]): [number, number] => [(angle * law) / 160, c]);
    expect(findingOf('table-span', fitting).severity).toBe('ok');
    const travel = Number(/travel about ([\d.]+)°/.exec(stretched.change)![1]);
    expect(travel).toBeCloseTo(180 + 160 - law, 1);
  });

  test('that it makes waves', () => {
    expect(findingOf('table-rough', straight)).toMatchObject({ severity: 'ok', value: 0 });
    const waves = Array.from({ length: 19 }, (_, i): [number, number] => [
      10 * i,
      45 + 19 * i + (i % 2),
    ]);
    expect(findingOf('table-rough', waves)).toMatchObject({ severity: 'warn', value: 16 });
  });
});

test('a table of angle and frequency tunes the coil to its rows', () => {
  const rows: [number, number][] = [
    [0, 1600],
    [45, 1290],
    [90, 1010],
    [135, 760],
    [180, 540],
  ];
  const section = plates((s) => {
    s.law = 'points';
    s.lawPoints = rows.map(([angle, f]) => [angle * DEGREE, f * 1e3]);
  });
  for (const [angle, f] of rows) {
    const tuned =
      resonantFrequency(achievedAt(section, angle / 180), section.inductance!) / 1e3;
    expect(Math.abs(tuned - f) / f).toBeLessThan(0.003);
  }
});

describe('a formula', () => {
  test('that is a named law gives that law’s plates', () => {
    const named = plates((s) => (s.law = 'capacitance'));
    const written = plates((s) => {
      s.law = 'formula';
      s.lawFormula = '3 + 7x';
      s.statorForm = 'even';
    });
    expect(written.rotor.area / named.rotor.area).toBeCloseTo(1, 4);
  });

  test('of its own is held within 0.1 % of the range', () => {
    const section = plates((s) => {
      s.law = 'formula';
      s.lawFormula = 'x^1.5 + x';
    });
    expect(section.law.largestInner.fraction).toBeLessThan(1e-3);
  });
});

describe.each([
  ['points', { lawPoints: [] }, 'at least 3 rows'],
  [
    'points',
    {
      lawPoints: [
        [0, 1e-10],
        [1, 9e-11],
        [2, 2e-10],
      ],
    },
    'Row 2',
  ],
  ['formula', { lawFormula: '1 - x' }, 'does not rise'],
  ['formula', { lawFormula: 'log(x)' }, 'no number'],
  ['formula', { lawFormula: 'y + 1' }, 'y is not known'],
  ['formula', { lawFormula: '' }, 'empty'],
] as const)('law %s with %o', (law, values, words) => {
  test(`is refused: ${words}`, () => {
    const result = derivation((s) => {
      s.targetKind = 'terminals';
      Object.assign(s, { law, ...values });
    });
    expect(result.ok).toBe(false);
    const finding = result.ok ? undefined : result.findings.find((f) => f.code === 'own-law');
    expect(finding?.change).toContain(words);
  });
});

test.each([
  'x = 3',
  'f(x) = x',
  'import("fs")',
  'x.constructor',
  'constructor(1)',
  '__proto__',
  '[1, 2]',
  '"a"',
  'x; 1',
  'x > 0 ? 1 : 2',
  'if(x, 1, 2)',
  'evaluate("1")',
  'createUnit("a")',
  `${'('.repeat(100)}x${')'.repeat(100)}`,
  'x+'.repeat(99) + 'x',
  'x'.repeat(1000),
])('the evaluator is closed to %s', (text) => {
  expect(readFormula(text).ok).toBe(false);
});

test.each([
  ['x^2', 0.25],
  ['2x + 1', 2],
  ['sqrt(x) + sin(pi x / 2)', Math.SQRT1_2 + Math.sin(Math.PI / 4)],
  ['-e^-x', -Math.exp(-0.5)],
  ['max(x, 1/3)', 0.5],
])('%s at one half', (text, value) => {
  const read = readFormula(text);
  expect(read.ok && read.valueAt(0.5)).toBeCloseTo(value, 12);
});
