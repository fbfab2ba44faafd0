/** A law as the builder's own table: shaft angle and total capacitance, or the frequency it tunes. */

/** Angle from the law's beginning, rad, and capacitance in F or frequency in Hz. */
export type LawPoint = readonly [angle: number, value: number];

export const MOST_POINTS = 200;
export const FEWEST_POINTS = 3;

/** What is wrong with a row of the table, counted from 1, or null. */
export interface RowFault {
  readonly row: number;
  readonly fault: 'not-numbers' | 'angle-falls' | 'value-not-positive';
}

/** The first row that can't be: each is two numbers, angles rise from row to row. */
export function faultIn(points: readonly unknown[]): RowFault | null {
  let before = -Infinity;
  for (const [i, point] of points.entries()) {
    const row = i + 1;
    if (!Array.isArray(point) || point.length !== 2 || !point.every(Number.isFinite)) {
      return { row, fault: 'not-numbers' };
    }
    const [angle, value] = point as [number, number];
    if (angle <= before) return { row, fault: 'angle-falls' };
    if (value <= 0) return { row, fault: 'value-not-positive' };
    before = angle;
  }
  return null;
}

export const rowFaults: Readonly<Record<RowFault['fault'], string>> = {
  'not-numbers': 'an angle and a value are needed',
  'angle-falls': 'its angle must be larger than that of the row before',
  'value-not-positive': 'its value must be larger than 0',
};

/**
 * Slopes at the points for a cubic that rises wherever the points do, without overshoot:
 * F. N. Fritsch and R. E. Carlson, "Monotone Piecewise Cubic Interpolation", SIAM J. Numer. Anal.
 * 17(2), 1980, with the harmonic mean of F. N. Fritsch and J. Butland, SIAM J. Sci. Stat. Comput.
 * 5(2), 1984.
 * @param x rising @param y rising or level
 * @param leastAtEnds least slope at either end, as a share of the slope between the points there
 */
export function monotoneSlopes(
  x: readonly number[],
  y: readonly number[],
  leastAtEnds = 0,
): number[] {
  const n = x.length;
  const h = Array.from({ length: n - 1 }, (_, i) => x[i + 1]! - x[i]!);
  const secant = h.map((step, i) => (y[i + 1]! - y[i]!) / step);
  const inner = (i: number): number => {
    const [left, right] = [secant[i - 1]!, secant[i]!];
    if (left * right <= 0) return 0;
    const w1 = 2 * h[i]! + h[i - 1]!;
    const w2 = h[i]! + 2 * h[i - 1]!;
    return (w1 + w2) / (w1 / left + w2 / right);
  };
  const end = (h0: number, h1: number, s0: number, s1: number): number => {
    const slope = ((2 * h0 + h1) * s0 - h0 * s1) / (h0 + h1);
    if (slope * Math.sign(s0) <= leastAtEnds * Math.abs(s0)) return leastAtEnds * s0;
    return s0 * s1 < 0 && Math.abs(slope) > 3 * Math.abs(s0) ? 3 * s0 : slope;
  };
  if (n === 2) return [secant[0]!, secant[0]!];
  return Array.from({ length: n }, (_, i) => {
    if (i === 0) return end(h[0]!, h[1]!, secant[0]!, secant[1]!);
    if (i === n - 1) return end(h[n - 2]!, h[n - 3]!, secant[n - 2]!, secant[n - 3]!);
    return inner(i);
  });
}

/** A cubic through points with slopes. */
export interface Cubic {
  readonly value: (at: number) => number;
  readonly slope: (at: number) => number;
}

export function monotoneCubic(
  x: readonly number[],
  y: readonly number[],
  leastAtEnds = 0,
): Cubic {
  const slopes = monotoneSlopes(x, y, leastAtEnds);
  const piece = (at: number) => {
    let i = 0;
    while (i < x.length - 2 && at > x[i + 1]!) i += 1;
    const h = x[i + 1]! - x[i]!;
    const t = (at - x[i]!) / h;
    const rise = y[i + 1]! - y[i]!;
    // Hermite's form: y + t·(h·m0 + t·(b + t·a)).
    const a = h * (slopes[i]! + slopes[i + 1]!) - 2 * rise;
    const b = 3 * rise - h * (2 * slopes[i]! + slopes[i + 1]!);
    return { h, t, a, b, y: y[i]!, m: h * slopes[i]! };
  };
  return {
    value: (at) => {
      const { t, a, b, y: y0, m } = piece(at);
      return y0 + t * (m + t * (b + t * a));
    },
    slope: (at) => {
      const { h, t, a, b, m } = piece(at);
      return (m + t * (2 * b + 3 * t * a)) / h;
    },
  };
}
