/** Ways of filling that are worth a try: which rotations, which order, what decides. */

import type { Measure, Pose, Way } from './fill';

interface Amount {
  /** mm² */
  readonly area: number;
  readonly quantity: number;
}

/** Largest parts first. */
function byArea(amounts: readonly Amount[]): number[] {
  return amounts
    .map(({ area, quantity }, part) => ({ area, quantity, part }))
    .sort((a, b) => b.area - a.area || a.part - b.part)
    .flatMap(({ part, quantity }) => Array.from({ length: quantity }, () => part));
}

/** One of each in turn, so that unlike parts come to lie beside each other. */
function inTurn(amounts: readonly Amount[]): number[] {
  const left = amounts.map(({ quantity }) => quantity);
  const order: number[] = [];
  while (left.some((quantity) => quantity > 0)) {
    left.forEach((quantity, part) => {
      if (quantity === 0) return;
      order.push(part);
      left[part] = quantity - 1;
    });
  }
  return order;
}

export function waysOf(poses: readonly (readonly Pose[])[], amounts: readonly Amount[]): Way[] {
  const largestFirst = byArea(amounts);
  const orders = amounts.length > 1 ? [largestFirst, inTurn(amounts)] : [largestFirst];
  const steps = Math.max(...poses.map((list) => list.length));
  /** Every so-many-th pose from a first one. */
  const some = (first: number, count: number): Pose[][] =>
    poses.map((list) =>
      list.length < steps
        ? [...list]
        : list.filter((_, turn) => turn % (steps / count) === first % (steps / count)),
    );
  const all = poses.map((list) => [...list]);
  const ways = (chosen: Pose[][], measures: readonly Measure[]): Way[] =>
    orders.flatMap((order) => measures.map((measure) => ({ poses: chosen, order, measure })));
  if (steps <= 2) return ways(all, ['weight', 'edge']);
  // A part and its twin turned half round, at each bearing; then four ways; then any.
  const pairs =
    steps % 2 === 0
      ? Array.from({ length: steps / 2 }, (_, first) => ({
          poses: some(first, 2),
          order: largestFirst,
          measure: 'weight' as const,
        }))
      : [];
  const fours = steps % 4 === 0 && steps > 4 ? ways(some(0, 4), ['weight', 'edge']) : [];
  return [...pairs, ...fours, ...ways(all, ['weight', 'edge', 'middle'])];
}
