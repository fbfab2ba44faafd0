import type { Derived } from '@/geometry';
import { stackRods } from './rods';

/** What the camera must hold: a ball round the whole stack, shaft ends included, mm. */
export interface StackSize {
  /** Middle of the stack along the shaft. */
  readonly middle: number;
  readonly radius: number;
}

export function stackSize(derived: Derived): StackSize {
  const { shaft } = stackRods(derived);
  return {
    middle: (shaft.from + shaft.to) / 2,
    radius: Math.hypot(derived.stack.outerRadius, derived.stack.depth / 2),
  };
}
