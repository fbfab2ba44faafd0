'use client';

import { useEffect, useRef, useState } from 'react';
import type { Derived } from '@/geometry';
import type { Body } from './bodies';
import type { BodiesAnswer } from './bodies.worker';

export interface Built {
  /** The plates that the bodies are of. */
  readonly derived: Derived;
  readonly bodies: readonly Body[];
}

/**
 * All parts of the plates last derived, put together in a worker. One question is on its way at a
 * time and the latest waits, so typing builds no queue.
 */
export function useBodies(derived: Derived): Built | null {
  const [built, setBuilt] = useState<Built | null>(null);
  const ask = useRef<((derived: Derived) => void) | null>(null);

  useEffect(() => {
    const worker = new Worker(new URL('./bodies.worker.ts', import.meta.url), {
      type: 'module',
    });
    let asked: Derived | null = null;
    let waiting: Derived | null = null;
    const next = (): void => {
      asked = waiting;
      waiting = null;
      if (asked) worker.postMessage(asked);
    };
    worker.onmessage = ({ data }: MessageEvent<BodiesAnswer>) => {
      // What can't be put together is told by the checks; the picture stays as it was.
      if (asked && 'bodies' in data) setBuilt({ derived: asked, bodies: data.bodies });
      next();
    };
    worker.onerror = next;
    ask.current = (latest) => {
      waiting = latest;
      if (!asked) next();
    };
    return () => {
      ask.current = null;
      worker.terminate();
    };
  }, []);
  useEffect(() => ask.current?.(derived), [derived]);
  return built;
}
