import type { Derived } from '@/geometry';
import { stackRods } from './rods';

/** What the camera must hold: a ball round the plates, mm. */
export interface StackSize {
  /** Middle of the stack along the shaft. */
  readonly middle: number;
  readonly radius: number;
}

/** Shaft ends may reach past the ball; this much room keeps them and the plates off the frame. */
const ROOM = 1.1;

export function stackSize(derived: Derived): StackSize {
  const { shaft } = stackRods(derived);
  return {
    middle: (shaft.from + shaft.to) / 2,
    radius: ROOM * Math.hypot(derived.stack.outerRadius, derived.stack.depth / 2),
  };
}
