/** Steps of 1, 2 and 5 between two values, as fine as there is room at each place. */

/** How many times a step is divided again at most. */
const DEEPEST = 4;

/** A number as it is counted, without what adding up leaves behind. */
const clean = (value: number): number => Number(value.toPrecision(12));

/**
 * Values between low and high. A step of ten units is divided into ten, into five twos, or into
 * halves of which each may be divided again; a division is taken where all its values fit.
 * @param fits may the values stand beside each other? They come in rising order, with the ends of
 *   the step that they divide where those are on the scale.
 */
export function steps(
  low: number,
  high: number,
  fits: (values: readonly number[]) => boolean,
): number[] {
  const found = new Set<number>();
  // Half a part in a thousand million for what reckoning leaves over.
  const [from, to] = [low - 5e-10 * Math.abs(low), high + 5e-10 * Math.abs(high)];
  const range = (start: number, step: number, parts: number): number[] =>
    Array.from({ length: parts + 1 }, (_, k) => clean(start + k * step)).filter(
      (value) => value >= from && value <= to,
    );
  const take = (values: readonly number[]): void => values.forEach((value) => found.add(value));

  function divide(start: number, unit: number, depth: number): void {
    if (depth > DEEPEST || start > to || start + 10 * unit < from) return;
    const halves = range(start, 5 * unit, 2);
    if (!fits(halves)) return;
    const ones = [0, 5].map((half) => range(start + half * unit, unit, 5));
    const fine = ones.map((half) => half.length > 0 && fits(half));
    const twos = range(start, 2 * unit, 5);
    if (!fine.some(Boolean) && fits(twos)) {
      take(twos);
      return;
    }
    take(halves);
    fine.forEach((divided, half) => {
      if (!divided) {
        // Beside a half in ones, this one in the twos that lie in it.
        const coarse = ones[half]!.filter((v) => twos.includes(v) || halves.includes(v));
        if (fits(coarse)) take(coarse);
        return;
      }
      take(ones[half]!);
      for (let k = 0; k < 5; k++) {
        divide(clean(start + (5 * half + k) * unit), unit / 10, depth + 1);
      }
    });
  }

  const unit = 10 ** Math.ceil(Math.log10(high - low));
  for (let k = Math.floor(low / unit); k * unit <= to; k++) {
    const ends = range(k * unit, unit, 1);
    if (fits(ends)) take(ends);
    divide(clean(k * unit), unit / 10, 0);
  }
  return [...found].sort((a, b) => a - b);
}

/** The largest of 1, 5, 10, 50 … that divides a value, in whatever power of ten. */
export function roundness(value: number): number {
  if (value === 0) return Infinity;
  let power = 10 ** Math.floor(Math.log10(Math.abs(value)) + 1e-9);
  const divides = (step: number): boolean =>
    Math.abs(value / step - Math.round(value / step)) < 1e-6;
  while (!divides(power)) power /= 10;
  return divides(5 * power) ? 5 * power : power;
}
