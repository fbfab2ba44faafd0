import type { Derived } from '@/geometry';
import { contourBounds } from '@/geometry/measure';
import type { Body } from './bodies';

/** What the camera must hold: a ball round the plates and what else is shown, mm. */
export interface StackSize {
  /** Middle of it along the shaft. */
  readonly middle: number;
  readonly radius: number;
}

/** Shaft ends may reach past the ball; this much room keeps them and the plates off the edge. */
const ROOM = 1.1;

/** Farthest corner of a body's box from the shaft. */
function reachOf({ plan, places }: Body): number {
  const { minX, minY, maxX, maxY } = contourBounds(plan.outside);
  const own = Math.hypot(Math.max(-minX, maxX), Math.max(-minY, maxY));
  return Math.max(...places.map(({ x, y }) => Math.hypot(x, y) + own));
}

/** @param frame is it shown? */
export function stackSize(
  { stack }: Derived,
  bodies: readonly Body[],
  frame: boolean,
): StackSize {
  const plates = frame ? bodies.filter(({ kind }) => kind === 'end-plate') : [];
  const faces = plates.flatMap(({ places }) => places.flatMap(({ from, to }) => [from, to]));
  const [low, high] = [Math.min(0, ...faces), Math.max(stack.depth, ...faces)];
  const reach = Math.max(stack.outerRadius, ...plates.map(reachOf));
  return {
    middle: (low + high) / 2,
    radius: ROOM * Math.hypot(reach, (high - low) / 2),
  };
}
