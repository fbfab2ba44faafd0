import type { Derived } from '@/geometry';
import { assemblyFile, type AssemblyFormat } from './assembly-file';

export interface AssemblyQuestion {
  readonly derived: Derived;
  /** rad */
  readonly angle: number;
  readonly format: AssemblyFormat;
}

export type AssemblyAnswer = { readonly bytes: ArrayBuffer } | { readonly failure: string };

const answer = (said: AssemblyAnswer): void => postMessage(said);

addEventListener('message', ({ data }: MessageEvent<AssemblyQuestion>) => {
  const { derived, angle, format } = data;
  assemblyFile(derived, angle, format).then(
    (bytes) => answer({ bytes }),
    (error: unknown) => answer({ failure: String(error) }),
  );
});
