import { useRef, type PointerEvent, type RefObject } from 'react';
import type { AngleStore } from './angle-store';
import { toDegrees, toRadians } from './degrees';

/**
 * Sets the shaft angle from where the pointer is along a track, to 0.1°: a press goes there, a drag
 * follows. Spread the result on the element that takes the pointer.
 * @param track spans the travel from its left edge to its right. @param travel rad.
 */
export function useAngleDrag(
  store: AngleStore,
  travel: number,
  track: RefObject<HTMLElement | null>,
) {
  const held = useRef(false);

  function follow(event: PointerEvent) {
    const box = track.current?.getBoundingClientRect();
    if (!box || box.width === 0) return;
    const degrees = toDegrees(travel * ((event.clientX - box.left) / box.width));
    store.set(toRadians(Math.round(degrees * 10) / 10));
  }

  return {
    onPointerDown(event: PointerEvent<HTMLElement>) {
      if (event.button !== 0) return;
      event.currentTarget.setPointerCapture(event.pointerId);
      held.current = true;
      follow(event);
    },
    onPointerMove(event: PointerEvent<HTMLElement>) {
      if (held.current) follow(event);
    },
    onLostPointerCapture() {
      held.current = false;
    },
  };
}
