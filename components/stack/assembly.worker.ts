import type { Derived } from '@/geometry';
import { assemblyFile, type AssemblyFormat } from './assembly-file';

export interface AssemblyQuestion {
  readonly derived: Derived;
  /** rad */
  readonly angle: number;
  readonly format: AssemblyFormat;
}

addEventListener('message', ({ data }: MessageEvent<AssemblyQuestion>) => {
  const { derived, angle, format } = data;
  void assemblyFile(derived, angle, format).then((bytes) => postMessage(bytes));
});
