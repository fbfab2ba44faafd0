/** The printed dial: marks where the finished law has them, true size, nothing colliding. */
import { describe, expect, test } from 'vitest';
import { defaultDesign, derive, resonantFrequency, type Derived } from '../../../geometry';
import { DialError, dialBearing, dialOf, type DialSettings } from '../../../geometry/dial/dial';
import { dialMarks, dialValue } from '../../../geometry/dial/marks';
import { sketchSvg } from '../../../geometry/sketch/svg';

const derivation = derive(defaultDesign());
if (!derivation.ok) throw new Error('no plates');
const derived: Derived = derivation.derived;
const section = derived.sections[0]!;

const settings: DialSettings = {
  quantity: 'frequency',
  form: 'round',
  radius: 60,
  ratio: 1,
  drum: 150,
  sense: 'clockwise',
  hole: 6,
  title: 'Try',
};

function capacitanceAt(angle: number): number {
  const { law } = section;
  const i = Math.max(
    1,
    law.angle.findIndex((a) => a >= angle - 1e-12),
  );
  const [a, b] = [law.angle[i - 1]!, law.angle[i]!];
  return (
    law.achieved[i - 1]! + ((angle - a) / (b - a)) * (law.achieved[i]! - law.achieved[i - 1]!)
  );
}

describe.each(['frequency', 'wavelength', 'capacitance'] as const)('%s', (quantity) => {
  const spacing = { perRadian: 60, apart: 1.4, numberRoom: 8 };
  const marks = dialMarks(section, quantity, spacing);

  test('every mark stands at the angle at which the plates have its value', () => {
    expect(marks.length).toBeGreaterThan(20);
    for (const { value, angle } of marks) {
      const there = dialValue(capacitanceAt(angle), quantity, section.inductance!);
      expect(Math.abs(there / value - 1)).toBeLessThan(2e-4);
    }
  });

  test('marks stay apart, and numbers further', () => {
    const by = [...marks].sort((a, b) => a.angle - b.angle);
    for (let i = 1; i < by.length; i++) {
      expect((by[i]!.angle - by[i - 1]!.angle) * 60).toBeGreaterThan(1.4 * 0.99);
    }
    const numbers = by.filter(({ label }) => label !== null);
    expect(numbers.length).toBeGreaterThan(4);
    for (let i = 1; i < numbers.length; i++) {
      expect((numbers[i]!.angle - numbers[i - 1]!.angle) * 60).toBeGreaterThan(8 * 0.99);
    }
  });
});

test('1000 kHz stands where the coil tunes to it (Thomson’s formula), either sense, by the ratio', () => {
  const marks = dialMarks(section, 'frequency', { perRadian: 60, apart: 1.4, numberRoom: 8 });
  const mark = marks.find(({ value }) => Math.abs(value - 1e6) < 1)!;
  expect(resonantFrequency(capacitanceAt(mark.angle), section.inductance!) / 1e6).toBeCloseTo(
    1,
    4,
  );
  const one = dialBearing(section, settings, mark.angle);
  expect(dialBearing(section, { ...settings, sense: 'anticlockwise' }, mark.angle)).toBeCloseTo(
    -one,
    12,
  );
  expect(dialBearing(section, { ratio: 0.5, sense: 'clockwise' }, mark.angle)).toBeCloseTo(
    one / 2,
    12,
  );
});

test('the SVG is of true size and its check bar 50 mm long', () => {
  const svg = sketchSvg(dialOf(section, derived.turn, settings));
  const [, width, view] = /width="([\d.]+)mm".*?viewBox="0 0 ([\d.]+) /.exec(svg)!;
  expect(width).toBe(view);
  const bar = /M([\d.]+) ([\d.]+)L([\d.]+) \2"[^>]*stroke-width="0.25"/g;
  const lengths = [...svg.matchAll(bar)].map(([, x1, , x2]) => Number(x2) - Number(x1));
  expect(lengths).toContain(50);
});

test('a straight scale is as long as the drum winds for the travel', () => {
  const { marks } = dialOf(section, derived.turn, { ...settings, form: 'straight', ratio: 2 });
  const base = marks.find((mark) => mark.kind === 'stroke' && mark.width === 0.35)!;
  const [, from, to] = /^M([\d.]+) [\d.]+L([\d.]+) /.exec(
    base.kind === 'stroke' ? base.path : '',
  )!;
  expect(Number(to) - Number(from)).toBeCloseTo(150 * 2 * 0.5, 3);
});

test.each([
  [{ ratio: 3 }, /turn more than once/],
  [{ ratio: 0 }, /ratio/],
  [{ radius: 5 }, /radius/],
  [{ form: 'straight' as const, drum: 1 }, /drum/],
])('%o is refused with words', (change, message) => {
  expect(() => dialOf(section, derived.turn, { ...settings, ...change })).toThrow(DialError);
  expect(() => dialOf(section, derived.turn, { ...settings, ...change })).toThrow(message);
});

test('without a coil there is a dial of capacitance only', () => {
  const bare = { ...section, inductance: null };
  expect(() => dialOf(bare, derived.turn, settings)).toThrow(/coil/);
  expect(() =>
    dialOf(bare, derived.turn, { ...settings, quantity: 'capacitance' }),
  ).not.toThrow();
});
