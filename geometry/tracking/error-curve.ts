/** The tracking error over a band, and where it is largest. */

/** Hz */
export interface Band {
  readonly low: number;
  readonly high: number;
}

export interface ErrorPoint {
  readonly frequency: number;
  /** Hz, signed. */
  readonly error: number;
}

/** Looks over a band for its extremes. */
const LOOKS = 240;

const GOLDEN = (Math.sqrt(5) - 1) / 2;

/** @param steps intervals of equal width */
export function errorCurve(
  errorAt: (frequency: number) => number,
  { low, high }: Band,
  steps = LOOKS,
): ErrorPoint[] {
  return Array.from({ length: steps + 1 }, (_, i) => {
    const frequency = low + ((high - low) * i) / steps;
    return { frequency, error: errorAt(frequency) };
  });
}

/** The largest of a curve between two places that hold one extreme, by golden section. */
function extremeBetween(
  errorAt: (frequency: number) => number,
  from: number,
  to: number,
  sign: number,
): ErrorPoint {
  let [a, b] = [from, to];
  let left = b - GOLDEN * (b - a);
  let right = a + GOLDEN * (b - a);
  let [atLeft, atRight] = [sign * errorAt(left), sign * errorAt(right)];
  while (b - a > 1e-9 * to) {
    if (atLeft > atRight) {
      [b, right, atRight] = [right, left, atLeft];
      left = b - GOLDEN * (b - a);
      atLeft = sign * errorAt(left);
    } else {
      [a, left, atLeft] = [left, right, atRight];
      right = a + GOLDEN * (b - a);
      atRight = sign * errorAt(right);
    }
  }
  const frequency = (a + b) / 2;
  return { frequency, error: errorAt(frequency) };
}

/** Both ends of the band and every place between them where the error turns, rising in frequency. */
export function extremesOf(errorAt: (frequency: number) => number, band: Band): ErrorPoint[] {
  const curve = errorCurve(errorAt, band);
  const turns = curve.slice(1, -1).flatMap((point, i) => {
    const [before, after] = [curve[i]!, curve[i + 2]!];
    const sign = Math.sign(point.error - before.error);
    if (sign === 0 || Math.sign(after.error - point.error) === sign) return [];
    return [extremeBetween(errorAt, before.frequency, after.frequency, sign)];
  });
  return [curve[0]!, ...turns, curve.at(-1)!];
}

/** Where the error is largest over the band. */
export function peakOf(errorAt: (frequency: number) => number, band: Band): ErrorPoint {
  return extremesOf(errorAt, band).reduce((worst, point) =>
    Math.abs(point.error) > Math.abs(worst.error) ? point : worst,
  );
}

/** Where there is no error, Hz, rising. */
export function zerosOf(errorAt: (frequency: number) => number, band: Band): number[] {
  const curve = errorCurve(errorAt, band);
  const first = curve[0]!;
  const inside = curve.slice(1).flatMap((point, i) => {
    const before = curve[i]!;
    if (before.error === 0) return [];
    if (point.error === 0) return [point.frequency];
    if (before.error > 0 === point.error > 0) return [];
    let [a, b] = [before.frequency, point.frequency];
    while (b - a > 1e-12 * b) {
      const middle = (a + b) / 2;
      if (middle <= a || middle >= b) break;
      if (errorAt(middle) > 0 === before.error > 0) a = middle;
      else b = middle;
    }
    return [(a + b) / 2];
  });
  return first.error === 0 ? [first.frequency, ...inside] : inside;
}
