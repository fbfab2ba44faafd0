'use client';

import { useCallback, useEffect, useRef, useState } from 'react';
import type { JobMessage } from './messages';

export interface JobState<Answer> {
  readonly progress: { readonly done: number; readonly of: number } | null;
  readonly answer: Answer | null;
  readonly failure: string | null;
}

const idle = { progress: null, answer: null, failure: null };

export interface Job<Question, Answer> extends JobState<Answer> {
  readonly running: boolean;
  /** @param then gets the answer as it comes, besides the state */
  start(question: Question, then?: (answer: Answer) => void): void;
  cancel(): void;
}

/**
 * A longer piece of work in a worker of its own. Starting anew and cancelling end the one that
 * runs.
 */
export function useJob<Question, Answer>(makeWorker: () => Worker): Job<Question, Answer> {
  const [state, setState] = useState<JobState<Answer>>(idle);
  const worker = useRef<Worker | null>(null);
  const make = useRef(makeWorker);

  const end = useCallback(() => {
    worker.current?.terminate();
    worker.current = null;
  }, []);
  useEffect(() => end, [end]);

  const start = useCallback(
    (question: Question, then?: (answer: Answer) => void) => {
      end();
      const own = make.current();
      worker.current = own;
      setState((before) => ({ ...before, progress: { done: 0, of: 1 }, failure: null }));
      own.onmessage = ({ data }: MessageEvent<JobMessage<Answer>>) => {
        if (worker.current !== own) return;
        if ('done' in data) {
          setState((before) => ({ ...before, progress: data }));
          return;
        }
        end();
        if ('failure' in data) {
          setState((before) => ({ ...before, progress: null, failure: data.failure }));
          return;
        }
        setState({ progress: null, answer: data.answer, failure: null });
        then?.(data.answer);
      };
      own.onerror = ({ message }) => {
        end();
        setState((before) => ({ ...before, progress: null, failure: message }));
      };
      own.postMessage(question);
    },
    [end],
  );

  const cancel = useCallback(() => {
    end();
    setState((before) => ({ ...before, progress: null }));
  }, [end]);

  return { ...state, running: state.progress !== null, start, cancel };
}
