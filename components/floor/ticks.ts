/**
 * Round numbers, steps of 1, 2 or 5 times a power of ten, that lie in a range.
 * @param most at most this many
 */
export function roundTicks(low: number, high: number, most: number): number[] {
  const span = high - low;
  if (!(span > 0)) return [low];
  const power = 10 ** Math.floor(Math.log10(span / most));
  const step = [1, 2, 5, 10].map((k) => k * power).find((s) => span / s <= most)!;
  const first = Math.ceil(low / step - 1e-9);
  const last = Math.floor(high / step + 1e-9);
  return Array.from({ length: last - first + 1 }, (_, i) => {
    return Number(((first + i) * step).toPrecision(12));
  });
}

/** A range with room above and below what is drawn. */
export function withRoom(values: readonly number[]): [number, number] {
  const low = Math.min(...values);
  const high = Math.max(...values);
  const room = 0.06 * (high - low || Math.abs(high) || 1);
  return [low - room, high + room];
}

/** A range about 0 whose ends are round and hold all values; null is no value. */
export function aboutZero(values: readonly (number | null)[]): number {
  const largest = values.reduce<number>((most, v) => Math.max(most, Math.abs(v ?? 0)), 0) || 1;
  const power = 10 ** Math.floor(Math.log10(largest));
  return Number((Math.ceil(largest / power) * power).toPrecision(12));
}
