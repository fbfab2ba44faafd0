import { useRef, type PointerEvent } from 'react';
import type { AngleStore } from './angle-store';

/** Where the pointer is round the shaft, rad counter-clockwise, and the angle it holds there. */
interface Grip {
  bearing: number;
  angle: number;
}

/**
 * Turns the rotor with the pointer that took hold of it, on an SVG whose origin is the shaft. The
 * held angle runs on past the ends of the travel, so that the rotor stays under the pointer when
 * it comes back.
 */
export function useRotorDrag(store: AngleStore) {
  const grip = useRef<Grip | null>(null);

  return {
    onPointerDown(event: PointerEvent<SVGGraphicsElement>) {
      if (event.button !== 0) return;
      event.currentTarget.setPointerCapture(event.pointerId);
      grip.current = { bearing: bearingOf(event), angle: store.get() };
    },
    onPointerMove(event: PointerEvent<SVGGraphicsElement>) {
      const held = grip.current;
      if (!held) return;
      const bearing = bearingOf(event);
      const turned = Math.atan2(
        Math.sin(bearing - held.bearing),
        Math.cos(bearing - held.bearing),
      );
      grip.current = { bearing, angle: held.angle + turned };
      store.set(held.angle + turned);
    },
    onLostPointerCapture() {
      grip.current = null;
    },
  };
}

function bearingOf(event: PointerEvent<SVGGraphicsElement>): number {
  const svg = event.currentTarget.ownerSVGElement;
  const matrix = svg?.getScreenCTM();
  if (!matrix) return 0;
  const { x, y } = new DOMPoint(event.clientX, event.clientY).matrixTransform(matrix.inverse());
  return Math.atan2(-y, x);
}
