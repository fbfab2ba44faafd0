import type { Timing } from './client';

/** What only reads. */
const READS = ['list', 'open'];

/** Bound on the 95th percentile of reads, ms. */
const READ_BOUND = 300;

function at(values: readonly number[], share: number): number {
  const sorted = [...values].sort((a, b) => a - b);
  return sorted[Math.min(sorted.length - 1, Math.floor(share * sorted.length))] ?? 0;
}

const timesOf = (timings: readonly Timing[], kind: string): number[] =>
  timings.filter((timing) => timing.kind === kind).map(({ ms }) => ms);

/** Requests by kind: how many, and how long they took. */
export function printTimings(timings: readonly Timing[], seconds: number): void {
  const kinds = [...new Set(timings.map(({ kind }) => kind))].sort();
  console.log(`${(timings.length / seconds).toFixed(1)} requests a second`);
  for (const kind of kinds) {
    const times = timesOf(timings, kind);
    const [median, p95, longest] = [at(times, 0.5), at(times, 0.95), Math.max(...times)];
    console.log(
      `  ${kind.padEnd(9)} ${String(times.length).padStart(5)}  median ${median.toFixed(0).padStart(5)} ms  p95 ${p95.toFixed(0).padStart(5)} ms  longest ${longest.toFixed(0).padStart(5)} ms`,
    );
  }
}

/** Kinds of reads that were too slow. */
export const slowReads = (timings: readonly Timing[]): string[] =>
  READS.flatMap((kind) => {
    const p95 = at(timesOf(timings, kind), 0.95);
    return p95 <= READ_BOUND
      ? []
      : [`${kind}: p95 ${p95.toFixed(0)} ms, more than ${READ_BOUND} ms`];
  });
