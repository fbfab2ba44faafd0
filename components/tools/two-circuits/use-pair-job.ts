'use client';

import { useEffect } from 'react';
import { useJob, type Job } from '../job/use-job';
import type { PairAnswer, PairQuestion } from './two-circuits.worker';

const makeWorker = () =>
  new Worker(new URL('./two-circuits.worker.ts', import.meta.url), { type: 'module' });

/** Asks anew whenever the question changes; null asks nothing. */
export function usePairJob(question: PairQuestion | null): Job<PairQuestion, PairAnswer> {
  const job = useJob<PairQuestion, PairAnswer>(makeWorker);
  const { start } = job;
  const asked = question && JSON.stringify(question);
  useEffect(() => {
    if (asked !== null) start(JSON.parse(asked) as PairQuestion);
  }, [asked, start]);
  return job;
}
