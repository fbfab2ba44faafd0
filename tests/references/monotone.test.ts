/**
 * Monotone interpolation. The data set RPN 14 is from F. N. Fritsch and R. E. Carlson, SIAM J.
 * Numer. Anal. 17(2), 1980, table 1 (from memory); what a monotone cubic makes of it was computed
 * with scipy 1.17.1's PchipInterpolator, an implementation of another's making.
 */
import { expect, test } from 'vitest';
import { monotoneCubic } from '../../geometry/law-points';

const x = [7.99, 8.09, 8.19, 8.7, 9.2, 10, 12, 15, 20];
const y = [
  0, 2.76429e-5, 4.37498e-2, 0.169183, 0.469428, 0.94374, 0.998636, 0.999919, 0.999994,
];

test.each([
  [7.99, 0.0, 0.0],
  [8.0, 2.767433863187248e-7, 5.534518408242687e-5],
  [8.05, 9.956474181099992e-6, 0.00033175671817583645],
  [8.15, 0.023528278365786123, 0.5891170393088025],
  [8.5, 0.1166325769392755, 0.20580225251505585],
  [9.0, 0.33753432684619816, 0.6812468776692762],
  [9.5, 0.6852179451108994, 0.7673210945216192],
  [11, 0.9860433625350502, 0.025866439773565023],
  [13, 0.9993618220922759, 0.0005597473276787557],
  [17, 0.9999680257722139, 1.7829037964360213e-5],
  [20, 0.9999940000000002, 3.3881317890172014e-21],
])('at %f the curve has %f and slope %f', (at, value, slope) => {
  const cubic = monotoneCubic(x, y);
  expect(cubic.value(at)).toBeCloseTo(value, 12);
  expect(cubic.slope(at)).toBeCloseTo(slope, 10);
});

test('it never falls and never leaves the data', () => {
  const cubic = monotoneCubic(x, y);
  let before = -Infinity;
  for (let at = 7.99; at <= 20; at += 0.001) {
    const value = cubic.value(at);
    expect(value).toBeGreaterThanOrEqual(before - 1e-15);
    expect(value).toBeLessThanOrEqual(0.999994 + 1e-12);
    before = value;
  }
});
