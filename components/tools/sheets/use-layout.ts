'use client';

import { useEffect, useState } from 'react';
import type { LaidOut } from '@/geometry/nesting/lay-out';
import type { Message, Question } from './lay-out.worker';

/** ms without a change before it begins: nobody wants a layout of half a number. */
const SETTLED = 400;

interface Going {
  /** The question that is being worked on, or was stopped. */
  readonly question: Question;
  readonly share: number;
  readonly failure: string | null;
  readonly stopped: boolean;
}

export interface LayoutState {
  /** The last layout there was; it stays while a new one is made. */
  readonly laid: LaidOut | null;
  /** How much of the next one is done, 0 to 1; null when nothing is being made. */
  readonly share: number | null;
  readonly failure: string | null;
  readonly stopped: boolean;
  stop(): void;
  again(): void;
}

/** Lays out in a worker of its own, which is ended when the question changes or when stopped. */
export function useLayout(question: Question | null): LayoutState {
  const [laid, setLaid] = useState<LaidOut | null>(null);
  const [going, setGoing] = useState<Going | null>(null);
  const [asked, setAsked] = useState(0);
  const stopped = going !== null && going.stopped && going.question === question;

  useEffect(() => {
    if (!question || stopped) return;
    let worker: Worker | null = null;
    const begin = setTimeout(() => {
      setGoing({ question, share: 0, failure: null, stopped: false });
      worker = new Worker(new URL('./lay-out.worker.ts', import.meta.url), { type: 'module' });
      worker.onmessage = ({ data }: MessageEvent<Message>) => {
        if ('share' in data) {
          setGoing((now) => now && { ...now, share: data.share });
        } else if ('laid' in data) {
          setLaid(data.laid);
          setGoing(null);
        } else {
          setGoing((now) => now && { ...now, failure: data.failure });
        }
      };
      worker.onerror = ({ message }) => {
        setGoing((now) => now && { ...now, failure: message || 'The layout broke off.' });
      };
      worker.postMessage(question);
    }, SETTLED);
    return () => {
      clearTimeout(begin);
      worker?.terminate();
    };
  }, [question, stopped, asked]);

  return {
    laid,
    share: going && !going.stopped && !going.failure ? going.share : null,
    failure: going?.failure ?? null,
    stopped,
    stop: () => setGoing((now) => now && { ...now, stopped: true }),
    again: () => {
      setGoing(null);
      setAsked((count) => count + 1);
    },
  };
}
