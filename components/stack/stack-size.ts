import type { Derived } from '@/geometry';
import type { Body } from './bodies';
import { reach } from './plate-geometry';

/** What the camera must hold: a ball round the plates and what else is shown, mm. */
export interface StackSize {
  /** Middle of it along the shaft. */
  readonly middle: number;
  readonly radius: number;
}

/** Shaft ends may reach past the ball; this much room keeps them and the plates off the edge. */
const ROOM = 1.1;

/** @param frame is it shown? */
export function stackSize(
  { stack }: Derived,
  bodies: readonly Body[],
  frame: boolean,
): StackSize {
  const plates = frame ? bodies.filter(({ kind }) => kind === 'end-plate') : [];
  const faces = plates.flatMap(({ places }) => places.flatMap(({ from, to }) => [from, to]));
  const [low, high] = [Math.min(0, ...faces), Math.max(stack.depth, ...faces)];
  const across = Math.max(stack.outerRadius, ...plates.map(({ plan }) => reach(plan.outside)));
  return {
    middle: (low + high) / 2,
    radius: ROOM * Math.hypot(across, (high - low) / 2),
  };
}
