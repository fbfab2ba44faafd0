import type { Derived } from '@/geometry';
import { responseOf } from '@/geometry/tolerance/response';
import { stacksByChance, type Outcome } from '@/geometry/tolerance/stacks';
import type { Tolerances } from '@/geometry/tolerance/tolerances';
import { failureOf, type JobMessage } from '@/components/tools/job/messages';

export interface ToleranceQuestion {
  readonly derived: Derived;
  readonly section: number;
  readonly tolerances: Tolerances;
  readonly stacks: number;
  readonly seed: number;
  /** Of the range. */
  readonly limit: number;
}

export interface ToleranceAnswer {
  readonly outcome: Outcome;
  /** F */
  readonly range: number;
}

const send = (message: JobMessage<ToleranceAnswer>): void => postMessage(message);

addEventListener('message', ({ data }: MessageEvent<ToleranceQuestion>) => {
  try {
    const response = responseOf(data.derived, data.section);
    const run = stacksByChance(response, data.tolerances, data);
    let step = run.next();
    while (!step.done) {
      send({ done: step.value, of: data.stacks });
      step = run.next();
    }
    send({ answer: { outcome: step.value, range: response.range } });
  } catch (error) {
    send(failureOf(error));
  }
});
