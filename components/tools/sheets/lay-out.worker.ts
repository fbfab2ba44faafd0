import type { Derived } from '@/geometry';
import type { KerfState } from '@/geometry/cutting/cut-path';
import type { Machine, Sheet } from '@/geometry/cutting/machine';
import { sheetsFor } from '@/geometry/cutting/starting-values';
import { layOut, type LaidOut } from '@/geometry/nesting/lay-out';
import type { LayoutSettings } from '@/geometry/nesting/layout';
import { partsOf } from '@/geometry/parts/assembly';
import { failureOf, type JobMessage } from '../job/messages';

export interface Question {
  readonly derived: Derived;
  readonly copies: number;
  readonly machine: Machine;
  readonly sheet: Pick<Sheet, 'width' | 'height' | 'count'>;
  readonly settings: LayoutSettings;
  readonly kerf: KerfState;
}

function answer({ derived, sheet, ...job }: Question): JobMessage<LaidOut> {
  const parts = partsOf(derived).filter((part) => part.kind === 'cut');
  let told = 0;
  const laid = layOut({ ...job, parts, sheets: sheetsFor(parts, sheet) }, (done, of) => {
    const percent = Math.floor((100 * done) / of);
    if (percent > told) {
      told = percent;
      postMessage({ done: percent, of: 100 } satisfies JobMessage<LaidOut>);
    }
    return true;
  });
  // Whoever wants it stopped ends the worker.
  return laid ? { answer: laid } : { failure: 'The layout was stopped.' };
}

addEventListener('message', ({ data }: MessageEvent<Question>) => {
  try {
    postMessage(answer(data));
  } catch (error) {
    postMessage(failureOf(error));
  }
});
