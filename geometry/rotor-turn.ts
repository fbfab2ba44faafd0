import type { Turn } from './derived';

/** How far the rotor, drawn at mesh angle 0, is turned at a shaft angle: counter-clockwise, rad. */
export function rotorTurn({ direction, meshAtOpen }: Turn, shaftAngle: number): number {
  return direction * (meshAtOpen + shaftAngle);
}
