import { useLayoutEffect, useRef } from 'react';
import type { AngleStore } from './angle-store';

/**
 * Runs `apply` with the shaft angle now, after every render and whenever the store moves. `apply`
 * writes to elements it holds by ref; it must not set React state.
 */
export function useAngle(store: AngleStore, apply: (angle: number) => void): void {
  const latest = useRef(apply);
  useLayoutEffect(() => {
    latest.current = apply;
    apply(store.get());
  });
  useLayoutEffect(() => store.subscribe((angle) => latest.current(angle)), [store]);
}
