import { describe, expect, it } from 'vitest';
import { errorCurve, extremesOf, peakOf, zerosOf } from '../../geometry/tracking/error-curve';
import {
  chebyshevPoints,
  leastPeak,
  leastPeakWith,
  placed,
} from '../../geometry/tracking/least-peak';
import {
  threePoints,
  trackingError,
  twoPoints,
  type Conversion,
  type PaddedPair,
} from '../../geometry/tracking/padded-pair';
import { nearestPreferred, preferredSeries } from '../../geometry/tracking/preferred-values';

const receiver: Conversion = { intermediate: 455e3, side: 'above', plainCoil: 200e-6 };
const usual = [600e3, 1000e3, 1400e3] as const;
const band = { low: 530e3, high: 1600e3 };

const errorOf =
  (pair: PaddedPair) =>
  (at: number): number =>
    trackingError(pair, at);

describe('equal sections with padder and trimmer', () => {
  // Terman, Radio Engineers' Handbook, 1943 (the equations from memory); figures computed from
  // the equations.
  const pair = threePoints(receiver, usual);

  it('has the worked values at 600, 1000 and 1400 kHz, 200 µH and 455 kHz', () => {
    expect(pair.padder! * 1e12).toBeCloseTo(448.011967, 5);
    expect(pair.trimmer * 1e12).toBeCloseTo(11.228406, 5);
    expect(pair.paddedCoil / receiver.plainCoil).toBeCloseTo(0.567428587, 8);
  });

  it('has the worked errors inside the span, −3.99 kHz at 756 and +2.94 kHz at 1220', () => {
    const [, low, high] = extremesOf(errorOf(pair), { low: 600e3, high: 1400e3 });
    expect(low!.error / 1e3).toBeCloseTo(-3.99, 2);
    expect(Math.abs(low!.frequency / 1e3 - 756)).toBeLessThan(0.6);
    expect(high!.error / 1e3).toBeCloseTo(2.94, 2);
    expect(Math.abs(high!.frequency / 1e3 - 1220)).toBeLessThan(0.6);
  });

  it('has no error at its points, above and below', () => {
    const below: Conversion = { intermediate: 455e3, side: 'below', plainCoil: 60e-6 };
    for (const [conversion, points] of [
      [receiver, usual],
      [below, [2e6, 3e6, 4.5e6] as const],
    ] as const) {
      const made = threePoints(conversion, points);
      expect(made.padder).toBeGreaterThan(0);
      for (const point of points)
        expect(Math.abs(trackingError(made, point))).toBeLessThan(1e-3);
    }
  });

  it('meets two points with any padder, and with none', () => {
    for (const padder of [200e-12, 448e-12, 2e-9, null]) {
      const made = twoPoints(receiver, padder, [600e3, 1400e3]);
      for (const point of [600e3, 1400e3]) {
        expect(Math.abs(trackingError(made, point))).toBeLessThan(1e-3);
      }
    }
    const again = twoPoints(receiver, pair.padder, [600e3, 1400e3]);
    expect(again.trimmer).toBeCloseTo(pair.trimmer, 17);
    expect(again.paddedCoil).toBeCloseTo(pair.paddedCoil, 12);
  });

  it('refuses points out of order and a signal below the intermediate frequency', () => {
    expect(() => threePoints(receiver, [600e3, 600e3, 1400e3])).toThrow(
      /^Point 2: 600 kHz is not above the point before it; give more than 600 kHz$/,
    );
    expect(() => threePoints({ ...receiver, side: 'below' }, [400e3, 600e3, 1400e3])).toThrow(
      /^Point 1: 400 kHz is not above the intermediate frequency/,
    );
  });
});

describe('the points of least peak error', () => {
  const best = leastPeak(receiver, band);

  it('make four extremes of one size that turn sign', () => {
    const extremes = extremesOf(errorOf(best.pair), band);
    expect(extremes).toHaveLength(4);
    extremes.forEach(({ error }, i) => {
      expect(Math.abs(error) / Math.abs(best.peak.error)).toBeCloseTo(1, 6);
      if (i > 0) expect(Math.sign(error)).toBe(-Math.sign(extremes[i - 1]!.error));
    });
  });

  it('beat the usual points, those of Chebyshev and any near them', () => {
    const peak = Math.abs(best.peak.error);
    const peakAt = (points: readonly number[]): number =>
      Math.abs(
        placed(threePoints(receiver, points as [number, number, number]), points, band).peak
          .error,
      );
    expect(peak).toBeLessThan(peakAt(usual));
    expect(peak).toBeLessThan(peakAt(chebyshevPoints(band, 3)));
    for (const by of [-2e3, 2e3]) {
      for (let k = 0; k < 3; k++) {
        const moved = best.points.map((point, i) => (i === k ? point + by : point));
        expect(peakAt(moved)).toBeGreaterThan(peak);
      }
    }
  });

  it('stay the best when only trimmer and coil are free and the padder is theirs', () => {
    const again = leastPeakWith(receiver, best.pair.padder, band);
    expect(Math.abs(again.peak.error) / Math.abs(best.peak.error)).toBeCloseTo(1, 3);
  });

  it('cost more with a stock padder, and less than setting it at two points', () => {
    const stock = nearestPreferred('E12', best.pair.padder!);
    const made = leastPeakWith(receiver, stock, band);
    const two = twoPoints(receiver, stock, [best.points[0]!, best.points[2]!]);
    expect(Math.abs(made.peak.error)).toBeGreaterThan(Math.abs(best.peak.error));
    expect(Math.abs(made.peak.error)).toBeLessThan(Math.abs(peakOf(errorOf(two), band).error));
  });

  it('finds where a curve is nothing and follows it', () => {
    const at = (f: number): number => (f - 2) * (f - 5);
    expect(
      zerosOf(at, { low: 0, high: 10 }).map((zero) => Math.round(zero * 1e6) / 1e6),
    ).toEqual([2, 5]);
    expect(errorCurve(at, { low: 0, high: 10 }, 2).map(({ error }) => error)).toEqual([
      10, 0, 40,
    ]);
  });
});

describe('preferred values', () => {
  it('are those of IEC 60063', () => {
    // E96 from memory of the printed table.
    expect(preferredSeries.E12).toEqual([
      1, 1.2, 1.5, 1.8, 2.2, 2.7, 3.3, 3.9, 4.7, 5.6, 6.8, 8.2,
    ]);
    expect(preferredSeries.E24).toHaveLength(24);
    expect(preferredSeries.E96.slice(0, 8)).toEqual([
      1, 1.02, 1.05, 1.07, 1.1, 1.13, 1.15, 1.18,
    ]);
    expect(preferredSeries.E96.slice(-4)).toEqual([9.09, 9.31, 9.53, 9.76]);
  });

  it('are the nearest by ratio, over the decades', () => {
    expect(nearestPreferred('E12', 448e-12)).toBe(470e-12);
    expect(nearestPreferred('E24', 448e-12)).toBe(430e-12);
    expect(nearestPreferred('E96', 448e-12)).toBe(453e-12);
    expect(nearestPreferred('E12', 9.5e-10)).toBe(1e-9);
  });
});
