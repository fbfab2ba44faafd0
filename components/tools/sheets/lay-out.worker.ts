import type { Derived } from '@/geometry';
import type { KerfState } from '@/geometry/cutting/cut-path';
import type { Sheet } from '@/geometry/cutting/machine';
import { sheetsFor } from '@/geometry/cutting/starting-values';
import { layOut, type LaidOut } from '@/geometry/nesting/lay-out';
import type { LayoutSettings } from '@/geometry/nesting/layout';
import { partsOf } from '@/geometry/parts/assembly';
import { failureOf, type JobMessage } from '../job/messages';
import type { ShopMachine } from './use-shop';

export interface Question {
  readonly derived: Derived;
  readonly copies: number;
  readonly machine: ShopMachine;
  /** Taken where the workshop has no such sheet in its store. */
  readonly sheet: Pick<Sheet, 'width' | 'height' | 'count'>;
  readonly stock: readonly Sheet[];
  readonly settings: LayoutSettings;
  readonly kerf: KerfState;
}

/** mm. Sheet of this much other thickness is the same. */
const SAME_THICKNESS = 0.005;

function answer({ derived, sheet, stock, ...job }: Question): JobMessage<LaidOut> {
  const parts = partsOf(derived).filter((part) => part.kind === 'cut');
  const sheets = sheetsFor(parts, sheet).flatMap((asked) => {
    const own = stock.filter(
      ({ material, thickness, count }) =>
        count > 0 &&
        material === asked.material &&
        Math.abs(thickness - asked.thickness) < SAME_THICKNESS,
    );
    return own.length > 0
      ? own.map((found) => ({ ...found, thickness: asked.thickness }))
      : [asked];
  });
  let told = 0;
  const laid = layOut({ ...job, parts, sheets }, (done, of) => {
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
