/** The shaped oscillator section against its equations. */
import { describe, expect, it } from 'vitest';
import { defaultSection, type Section } from '../../geometry';
import { lawBetween } from '../../geometry/law';
import { lawOf } from '../../geometry/own-law';
import { resonantFrequency } from '../../geometry/resonance';
import { targetOf, type Target } from '../../geometry/target';

const oscillator: Section = { ...defaultSection(), law: 'tracked', oscillatorCoil: 120e-6 };

const reached = (of: ReturnType<typeof targetOf>): Target => {
  if ('code' in of) throw new Error(of.change);
  return of;
};

const bothOf = (bandLow: number, bandHigh: number, section = oscillator) => {
  const first: Section = {
    ...defaultSection(),
    bandLow,
    bandHigh,
    inductance: 200e-6,
    stray: 0,
  };
  const signal = reached(targetOf(first, 0, first));
  const target = reached(targetOf(section, 1, first));
  const law = lawOf(section, 1, target, first);
  if ('code' in law) throw new Error(law.change);
  return {
    signal,
    target,
    law,
    signalLaw: lawBetween('frequency', signal.totalMin, signal.totalMax),
  };
};

describe('the oscillator section', () => {
  // Computed from Co = Ko/(f + F)², Cs = Ks/f².
  it.each([
    [530e3, 1700e3, 10.2883588, 4.7865444],
    [526.5e3, 1606.5e3, 9.3103222, 4.4114978],
  ])('from %f to %f Hz and 455 kHz changes as it should', (low, high, signalRatio, ratio) => {
    const { signal, target } = bothOf(low, high);
    expect(signal.totalMax / signal.totalMin).toBeCloseTo(signalRatio, 6);
    expect(target.totalMax / target.totalMin).toBeCloseTo(ratio, 6);
  });

  // Computed: with the same gap and plates (ro² − rc²)/(rs² − rc²) = (L/Lo)·(f/(f + F))³, which is
  // the ratio of the slopes.
  it.each([
    [530e3, 0.155782589],
    [1000e3, 0.32464672],
    [1700e3, 0.490913461],
  ])('at %f Hz asks for the square of radii that its equation does', (frequency, cube) => {
    const { law, signalLaw } = bothOf(530e3, 1700e3);
    const x = (1700e3 - frequency) / (1700e3 - 530e3);
    expect(law.slope(x) / signalLaw.slope(x) / (200 / 120)).toBeCloseTo(cube, 8);
  });

  it.each(['above', 'below'] as const)('%s stays the intermediate frequency away', (side) => {
    const section: Section = {
      ...oscillator,
      oscillatorSide: side,
      intermediateFrequency: 200e3,
    };
    const { law, signalLaw, target } = bothOf(530e3, 1700e3, section);
    for (const x of [0, 0.2, 0.5, 0.9, 1]) {
      const signal = resonantFrequency(signalLaw.total(x), 200e-6);
      const tuned = resonantFrequency(law.total(x), 120e-6);
      expect(tuned - signal).toBeCloseTo(side === 'above' ? 200e3 : -200e3, 4);
      const step = 1e-5;
      if (x > 0 && x < 1) {
        const slope = (law.total(x + step) - law.total(x - step)) / (2 * step);
        expect(law.slope(x) / slope).toBeCloseTo(1, 6);
      }
    }
    expect(law.total(0)).toBeCloseTo(target.totalMin, 17);
    expect(law.total(1)).toBeCloseTo(target.totalMax, 17);
  });

  it('without a coil begins with as much of its own as section 1', () => {
    const { signal, target } = bothOf(530e3, 1700e3, { ...oscillator, oscillatorCoil: null });
    expect((target.totalMin - target.stray) / signal.totalMin).toBeCloseTo(1, 12);
  });
});
