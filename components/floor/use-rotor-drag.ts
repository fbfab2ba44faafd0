import { useRef, type PointerEvent, type RefObject } from 'react';
import type { AngleStore } from './angle-store';

/** Where the pointer is round the shaft, rad counter-clockwise, and the angle it holds there. */
interface Grip {
  bearing: number;
  angle: number;
}

/**
 * Turns the rotor with the pointer that took hold of it. `frame` has the shaft in its middle. The
 * held angle runs on past the ends of the travel, so that the rotor stays under the pointer when
 * it comes back.
 * @param direction 1 where the rotor meshes counter-clockwise, −1 where clockwise
 */
export function useRotorDrag(
  store: AngleStore,
  frame: RefObject<HTMLElement | null>,
  direction: 1 | -1,
) {
  const grip = useRef<Grip | null>(null);

  return {
    onPointerDown(event: PointerEvent<SVGGraphicsElement>) {
      if (event.button !== 0) return;
      event.currentTarget.setPointerCapture(event.pointerId);
      grip.current = { bearing: bearingOf(event, frame.current), angle: store.get() };
    },
    onPointerMove(event: PointerEvent<SVGGraphicsElement>) {
      const held = grip.current;
      if (!held) return;
      const bearing = bearingOf(event, frame.current);
      const turned = Math.atan2(
        Math.sin(bearing - held.bearing),
        Math.cos(bearing - held.bearing),
      );
      const angle = held.angle + direction * turned;
      grip.current = { bearing, angle };
      store.set(angle);
    },
    onLostPointerCapture() {
      grip.current = null;
    },
  };
}

function bearingOf(event: PointerEvent, frame: HTMLElement | null): number {
  const box = frame?.getBoundingClientRect();
  if (!box) return 0;
  return Math.atan2(
    box.top + box.height / 2 - event.clientY,
    event.clientX - box.left - box.width / 2,
  );
}
