/** The printed dial: marks where the finished law has them, true size, nothing colliding. */
import { describe, expect, test } from 'vitest';
import { defaultDesign, derive, type Derived } from '../../../geometry';
import { dialOf } from '../../../geometry/dial/dial';
import { DialError, type DialSettings } from '../../../geometry/dial/settings';
import { steps } from '../../../geometry/dial/steps';
import { sketchSvg } from '../../../geometry/sketch/svg';
import { bearingsOf, numbersOf, readDial, strokesOf } from '../../support/printed-dial';

const derivation = derive(defaultDesign());
if (!derivation.ok) throw new Error('no plates');
const derived: Derived = derivation.derived;
const section = derived.sections[0]!;
const { law } = section;

const settings: DialSettings = {
  quantity: 'frequency',
  form: 'round',
  moves: 'pointer',
  sense: 'clockwise',
  radius: 60,
  place: 'upper',
  open: 0,
  ratio: 1,
  drum: 150,
  hole: 6,
  title: 'Try',
};
const svgOf = (change: Partial<DialSettings> = {}, of = section): string =>
  sketchSvg(dialOf(of, derived.turn, { ...settings, ...change }));

/** Total capacitance at a shaft angle, F: the table of the law, read straight between its rows. */
function capacitanceAt(angle: number): number {
  const i = Math.max(
    1,
    law.angle.findIndex((a) => a >= angle),
  );
  const share = (angle - law.angle[i - 1]!) / (law.angle[i]! - law.angle[i - 1]!);
  return law.achieved[i - 1]! + share * (law.achieved[i]! - law.achieved[i - 1]!);
}

/** What a dial shows at a shaft angle, in kHz, m or pF. Thomson's formula; c exact (SI). */
function shownAt(angle: number, quantity: DialSettings['quantity']): number {
  const total = capacitanceAt(angle);
  if (quantity === 'capacitance') return total * 1e12;
  const frequency = 1 / (2 * Math.PI * Math.sqrt(section.inductance! * total));
  return quantity === 'frequency' ? frequency / 1e3 : 299_792_458 / frequency;
}

const middle = (law.from + law.to) / 2;

describe.each(['frequency', 'wavelength', 'capacitance'] as const)('%s', (quantity) => {
  const dial = readDial(svgOf({ quantity }));
  const marks = bearingsOf(dial, 60);
  const numbers = numbersOf(dial);

  test('every number stands at a mark, and the plates have its value there', () => {
    expect(numbers.length).toBeGreaterThan(5);
    for (const { value, bearing } of numbers) {
      const mark = marks.find((one) => Math.abs(one - bearing) < 1e-3)!;
      const there = shownAt(middle + mark, quantity);
      // Between rows of the law's table either reading is a chord.
      expect(Math.abs(there / value - 1), `${value}`).toBeLessThan(2e-4);
    }
  });

  test('marks between two numbers divide their step evenly in value', () => {
    expect(marks.length).toBeGreaterThan(2 * numbers.length);
    for (let i = 1; i < numbers.length; i++) {
      const [a, b] = [numbers[i - 1]!, numbers[i]!];
      const between = marks
        .filter((mark) => mark > a.bearing - 1e-3 && mark < b.bearing + 1e-3)
        .map((mark) => shownAt(middle + mark, quantity));
      const step = Math.abs(b.value - a.value);
      for (const value of between) {
        // 1-2-5: a mark is a whole multiple of a hundredth of its step.
        const off = Math.abs(((value - a.value) * 100) / step);
        expect(Math.abs(off - Math.round(off))).toBeLessThan(
          (100 * 2e-4 * value) / step + 1e-6,
        );
      }
    }
  });

  test('marks stay 1.4 mm apart at their inner ends', () => {
    for (let i = 1; i < marks.length; i++) {
      expect((marks[i]! - marks[i - 1]!) * (60 - 1 - 6)).toBeGreaterThan(1.4 - 1e-3);
    }
  });
});

test.each([
  { radius: 25, hole: 3, title: '' },
  { radius: 40 },
  { radius: 200 },
  { radius: 60, ratio: 1.9 },
  { radius: 60, ratio: 0.3 },
  { radius: 40, quantity: 'capacitance' as const, place: 'lower' as const },
  { form: 'straight' as const, drum: 60 },
  { form: 'straight' as const, drum: 150, ratio: 3 },
])('no numbers meet: %o', (change) => {
  const numbers = numbersOf(readDial(svgOf(change)));
  expect(numbers.length).toBeGreaterThan(1);
  // Discs about the middle of each letter, half its height: digits of this face are narrower.
  const discs = numbers.map(({ x, y, turn, text, height }) => {
    const pitch = 0.82 * height;
    return [...text].map((_, k) => {
      const along = (k - (text.length - 1) / 2) * pitch;
      return [x + along * Math.cos(turn), y + along * Math.sin(turn)] as const;
    });
  });
  for (const [i, one] of discs.entries()) {
    for (const other of discs.slice(i + 1)) {
      for (const [ax, ay] of one) {
        for (const [bx, by] of other) {
          expect(Math.hypot(bx - ax, by - ay)).toBeGreaterThan(numbers[0]!.height);
        }
      }
    }
  }
});

test('sense, what moves, place and ratio turn the marks', () => {
  const first = (change: Partial<DialSettings>): number => {
    const numbers = numbersOf(readDial(svgOf(change)));
    return numbers.find(({ value }) => value === 1000)!.bearing;
  };
  const one = first({});
  expect(first({ sense: 'anticlockwise' })).toBeCloseTo(-one, 4);
  expect(first({ moves: 'scale' })).toBeCloseTo(-one, 4);
  expect(first({ moves: 'scale', sense: 'anticlockwise' })).toBeCloseTo(one, 4);
  expect(first({ ratio: 0.5 })).toBeCloseTo(one / 2, 4);
  expect(first({ place: 'lower' }) - one).toBeCloseTo(one < 0 ? Math.PI : -Math.PI, 4);
  // The open stop at 3 o'clock: the mark is its own shaft angle further.
  const further = Math.PI / 2 + middle + one;
  expect(first({ place: 'open', open: Math.PI / 2 })).toBeCloseTo(
    further > Math.PI ? further - 2 * Math.PI : further,
    4,
  );
});

test('the SVG is of true size, with a check bar of 50 mm and a pointer', () => {
  const dial = readDial(svgOf());
  expect(dial.width).toBe(dial.viewWidth);
  expect(dial.height).toBe(dial.viewHeight);
  const lengths = strokesOf(dial)
    .filter(({ from, to }) => from.y === to.y)
    .map(({ from, to }) => to.x - from.x);
  expect(lengths).toContain(50);
  // From the pointer's hole to the edge of the scale.
  expect(lengths).toContain(60);
});

test('a straight scale is as long as the drum winds for the travel, marks where they belong', () => {
  const dial = readDial(svgOf({ form: 'straight', ratio: 2 }));
  const perRadian = (150 * 2) / (2 * Math.PI);
  const base = strokesOf(dial).find(({ width }) => width === 0.35)!;
  expect(base.to.x - base.from.x).toBeCloseTo(derived.turn.travel * perRadian, 3);
  const numbers = numbersOf(dial);
  expect(numbers.length).toBeGreaterThan(5);
  for (const { value, x } of numbers) {
    const there = shownAt((x - base.from.x) / perRadian, 'frequency');
    expect(Math.abs(there / value - 1)).toBeLessThan(2e-4);
  }
});

test.each([
  [{ ratio: 3 }, /turn more than once/],
  [{ ratio: 0 }, /Turns for one of the shaft: 0/],
  [{ radius: 5 }, /Radius: 5 mm/],
  [{ radius: 30, hole: 40 }, /Hole: 40 mm leaves no room/],
  [{ radius: 30, title: 'Forty letters that never fit in a circle' }, /Lettering/],
  [{ open: NaN }, /Open stop/],
  [{ form: 'straight' as const, drum: 1 }, /Drum: 1 mm/],
  [{ form: 'straight' as const, drum: 2000, ratio: 50 }, /50000 mm long/],
])('%o is refused with words', (change, message) => {
  expect(() => svgOf(change)).toThrow(DialError);
  expect(() => svgOf(change)).toThrow(message);
});

test('a law that falls somewhere has no dial', () => {
  const achieved = law.achieved.map((c, i) => (i === 40 ? law.achieved[39]! * 0.999 : c));
  expect(() => svgOf({}, { ...section, law: { ...law, achieved } })).toThrow(/does not rise/);
});

test('without a coil there is a dial of capacitance only', () => {
  const bare = { ...section, inductance: null };
  expect(() => svgOf({}, bare)).toThrow(/coil/);
  expect(() => svgOf({ quantity: 'capacitance' }, bare)).not.toThrow();
});

describe('steps', () => {
  test.each([
    // Counted by hand: the finest of 1, 2 and 5 that stays so far apart.
    [0.9, [10, 11, 12, 13, 14, 15, 16, 17, 18, 19, 20]],
    [1.9, [10, 12, 14, 16, 18, 20]],
    [4.9, [10, 15, 20]],
    [9.9, [10, 20]],
  ])('from 10 to 20, %d apart', (apart, expected) => {
    expect(
      steps(10, 20, (some) => some.every((v, i) => i === 0 || v - some[i - 1]! >= apart)),
    ).toEqual(expected);
  });

  test('a crowded end has fewer', () => {
    // Room goes as the square of what is left.
    const at = (value: number): number => -((30 - value) ** 2) / 8;
    const found = steps(10, 30, (some) =>
      some.every((v, i) => i === 0 || at(v) - at(some[i - 1]!) >= 1),
    );
    expect(found).toEqual(expect.arrayContaining([10, 10.5, 11, 20, 21, 22, 25]));
    expect(found).not.toContain(29);
    for (let i = 1; i < found.length; i++) {
      expect(at(found[i]!) - at(found[i - 1]!)).toBeGreaterThanOrEqual(1);
    }
  });
});
