'use client';

import { useCallback, useEffect, useRef, useState } from 'react';
import type { Derivation, Derived, Design, FieldModel, Finding } from '@/geometry';
import type { Answer, Question } from './derive.worker';

export interface Plates {
  /** The last plates there were; null only when there never were any. */
  readonly derived: Derived | null;
  /** What the checks say about the latest design that could be read. */
  readonly findings: readonly Finding[];
  /** Do the plates belong to the findings, or to an earlier design? */
  readonly current: boolean;
  /** The kernel itself failed: a fault of the program, not of the design. */
  readonly broken: boolean;
}

const STAGES: readonly FieldModel[] = ['edges', 'field'];

function platesAfter(before: Derived | null, derivation: Derivation): Plates {
  return derivation.ok
    ? {
        derived: derivation.derived,
        findings: derivation.derived.findings,
        current: true,
        broken: false,
      }
    : { derived: before, findings: derivation.findings, current: false, broken: false };
}

/** One question to the worker. Only one is ever on its way, so the next message is its answer. */
function ask(worker: Worker, question: Question): Promise<Derivation> {
  return new Promise((resolve, reject) => {
    worker.onmessage = ({ data }: MessageEvent<Answer>) => {
      if ('derivation' in data) resolve(data.derivation);
      else reject(new Error(data.failure));
    };
    worker.onerror = ({ message }) => reject(new Error(message));
    worker.postMessage(question);
  });
}

/**
 * Derives in a worker, in two stages: with the edges alone, which is soon there, and then with the
 * plan view. At most one stage is on its way and one design waits: a newer one takes the waiting
 * one's place, so typing never builds a queue, and what is outdated when it arrives is dropped.
 */
export function useDerivation(first: Derivation): [Plates, (design: Design) => void] {
  const [plates, setPlates] = useState(() => platesAfter(null, first));
  const kernel = useRef<Worker | null>(null);
  const waiting = useRef<Design | null>(null);
  const busy = useRef(false);

  useEffect(() => {
    const worker = new Worker(new URL('./derive.worker.ts', import.meta.url), {
      type: 'module',
    });
    kernel.current = worker;
    return () => {
      kernel.current = null;
      busy.current = false;
      worker.terminate();
    };
  }, []);

  const request = useCallback(async (design: Design) => {
    waiting.current = design;
    if (busy.current) return;
    busy.current = true;
    while (kernel.current && waiting.current) {
      const worker = kernel.current;
      const next = waiting.current;
      waiting.current = null;
      try {
        for (const model of STAGES) {
          const derivation = await ask(worker, { design: next, model });
          if (kernel.current !== worker) return;
          if (waiting.current && model === 'field') break;
          setPlates((before) => platesAfter(before.derived, derivation));
          // What has no plates with the edges alone gets none from the plan view.
          if (waiting.current || !derivation.ok) break;
        }
      } catch {
        setPlates((before) => ({ ...before, current: false, broken: true }));
      }
    }
    busy.current = false;
  }, []);

  return [plates, request];
}
