/** A dial of several bands on one gang: each arc's numbers stand where its circuit has them. */
import { describe, expect, it } from 'vitest';
import { defaultDesign, derive } from '../../../geometry';
import { bandsDial } from '../../../geometry/dial/bands-dial';
import { DialError, type DialSettings } from '../../../geometry/dial/settings';
import { resonantFrequency } from '../../../geometry/resonance';
import { sketchSvg } from '../../../geometry/sketch/svg';
import { bandScale } from '../../../geometry/tracking/bands';
import { bearingsOf, numbersOf, readDial } from '../../support/printed-dial';

const derivation = derive(defaultDesign(), { model: 'edges' });
if (!derivation.ok) throw new Error('no plates');
const { derived } = derivation;
const { law } = derived.sections[0]!;

const settings: DialSettings = {
  quantity: 'frequency',
  form: 'round',
  moves: 'pointer',
  sense: 'clockwise',
  radius: 80,
  place: 'upper',
  open: 0,
  ratio: 1,
  drum: 150,
  hole: 6,
  title: 'Three bands',
};

const circuits = [
  { name: 'Long', signalCoil: 2.2e-3, signalStray: 20e-12, scale: 1e-3 },
  { name: 'Medium', signalCoil: 240e-6, signalStray: 25e-12, scale: 1e-3 },
  { name: 'Short', signalCoil: 3e-6, signalStray: 40e-12, scale: 1e-6 },
];
const bands = circuits.map((band) => ({ name: band.name, scale: bandScale(derived, band) }));
const dial = readDial(sketchSvg(bandsDial(bands, derived.turn, settings)));

/** Capacitance of a band at a shaft angle, F, straight between the rows of the law's table. */
function totalAt(which: number, angle: number): number {
  const { achieved } = bands[which]!.scale.law;
  const i = Math.max(
    1,
    law.angle.findIndex((at) => at >= angle),
  );
  const share = (angle - law.angle[i - 1]!) / (law.angle[i]! - law.angle[i - 1]!);
  return achieved[i - 1]! + share * (achieved[i]! - achieved[i - 1]!);
}

describe('each band', () => {
  const axis = { x: dial.width / 2, y: 90 };
  const numbers = numbersOf(dial);
  // 6 mm of mark, 2.5 of number and three times 0.8 of room from arc to arc.
  const radii = circuits.map((_, i) => 80 - i * 10.9);

  it.each(circuits.map(({ name }, i) => [name, i] as const))('%s', (_, which) => {
    const radius = radii[which]!;
    const own = numbers.filter(({ x, y }) => {
      const away = Math.hypot(x - axis.x, y - axis.y);
      return away < radius - 7 && away > radius - 10.9;
    });
    const marks = bearingsOf(dial, radius);
    expect(own.length).toBeGreaterThan(3);
    expect(marks.length).toBeGreaterThan(own.length);
    const middle = (law.from + law.to) / 2;
    for (const { value, bearing } of own) {
      const mark = marks.find((one) => Math.abs(one - bearing) < 1e-3)!;
      const { signalCoil, scale } = circuits[which]!;
      const there = scale * resonantFrequency(totalAt(which, middle + mark), signalCoil);
      expect(Math.abs(there / value - 1), `${value}`).toBeLessThan(5e-4);
    }
  });

  it('says its name and unit behind its arc', () => {
    for (const words of ['Long, kHz', 'Medium, kHz', 'Short, MHz']) {
      expect(dial.svg).toContain(`>${words}</text>`);
    }
  });
});

it('what has no room is refused with what would do', () => {
  const made = (change: Partial<DialSettings>, name = 'Long') =>
    bandsDial([{ ...bands[0]!, name }, ...bands.slice(1)], derived.turn, {
      ...settings,
      ...change,
    });
  expect(() => made({ radius: 40 })).toThrow(
    /^Radius: 40 mm has no room for 3 bands; give at least 46 mm\.$/,
  );
  expect(() => made({ radius: 46 })).not.toThrow();
  expect(() =>
    made(
      {},
      'A name that goes on and on all round the dial, and further than it may, and round once more, and on',
    ),
  ).toThrow(DialError);
});
