'use client';

import { useRef, type ReactNode, type RefObject } from 'react';
import type { AngleStore } from './angle-store';
import { useAngle } from './use-angle';

/**
 * The red line of the shaft angle. It is as wide as its parent, which spans the travel, and is
 * moved by a share of its own width: nothing is measured and nothing laid out again.
 * @param travel rad.
 */
export function AngleCursor({
  store,
  travel,
  children,
}: {
  store: AngleStore;
  travel: number;
  children?: ReactNode;
}) {
  const line: RefObject<HTMLDivElement | null> = useRef(null);
  useAngle(store, (angle) => {
    if (line.current) line.current.style.transform = `translateX(${(100 * angle) / travel}%)`;
  });
  return (
    <div
      ref={line}
      data-part="cursor"
      className="pointer-events-none absolute inset-0 will-change-transform"
    >
      <div className="absolute inset-y-0 -left-px w-0.5 bg-bad" />
      {children}
    </div>
  );
}
