/**
 * Preferred values of IEC 60063: E12 and E24 as they are printed there (from memory), E96 by its
 * rule, 10^(k/96) to three digits, which has no exceptions.
 */

const E24 = [
  1.0, 1.1, 1.2, 1.3, 1.5, 1.6, 1.8, 2.0, 2.2, 2.4, 2.7, 3.0, 3.3, 3.6, 3.9, 4.3, 4.7, 5.1, 5.6,
  6.2, 6.8, 7.5, 8.2, 9.1,
];

export type PreferredSeries = 'E12' | 'E24' | 'E96';

export const preferredSeries: Readonly<Record<PreferredSeries, readonly number[]>> = {
  E12: E24.filter((_, i) => i % 2 === 0),
  E24,
  E96: Array.from({ length: 96 }, (_, k) => Number((10 ** (k / 96)).toFixed(2))),
};

/** The value of a series nearest to one by ratio, in its unit; the value is above 0. */
export function nearestPreferred(series: PreferredSeries, value: number): number {
  const decade = Math.floor(Math.log10(value));
  let best = NaN;
  let apart = Infinity;
  for (const exponent of [decade - 1, decade, decade + 1]) {
    for (const step of preferredSeries[series]) {
      const tried = Number(`${step}e${exponent}`);
      const ratio = Math.abs(Math.log(tried / value));
      if (ratio < apart) [best, apart] = [tried, ratio];
    }
  }
  return best;
}
