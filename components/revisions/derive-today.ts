import type { Answer, Question } from '@/components/design/derive.worker';
import type { Derivation, Design } from '@/geometry';

/** What today's kernel makes of a design, in a worker of its own. @throws Error when it fails */
export function deriveToday(design: Design): Promise<Derivation> {
  return new Promise((resolve, reject) => {
    const worker = new Worker(new URL('../design/derive.worker.ts', import.meta.url), {
      type: 'module',
    });
    worker.onmessage = ({ data }: MessageEvent<Answer>) => {
      worker.terminate();
      if ('derivation' in data) resolve(data.derivation);
      else reject(new Error(data.failure));
    };
    worker.onerror = ({ message }) => {
      worker.terminate();
      reject(new Error(message));
    };
    worker.postMessage({ design, model: 'field' } satisfies Question);
  });
}
