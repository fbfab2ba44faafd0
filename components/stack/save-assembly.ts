import type { Derived } from '@/geometry';
import type { AssemblyFormat } from './assembly-file';
import type { AssemblyAnswer, AssemblyQuestion } from './assembly.worker';

function written(question: AssemblyQuestion): Promise<ArrayBuffer> {
  const worker = new Worker(new URL('./assembly.worker.ts', import.meta.url), {
    type: 'module',
  });
  return new Promise<ArrayBuffer>((resolve, reject) => {
    worker.onmessage = ({ data }: MessageEvent<AssemblyAnswer>) =>
      'bytes' in data ? resolve(data.bytes) : reject(new Error(data.failure));
    worker.onerror = ({ message }) => reject(new Error(message));
    worker.postMessage(question);
  }).finally(() => worker.terminate());
}

/**
 * Makes the file in a worker, so that what writes it stays out of the screen's own script, and
 * hands it to the browser as a download.
 */
export async function saveAssembly(
  derived: Derived,
  angle: number,
  format: AssemblyFormat,
): Promise<void> {
  const bytes = await written({ derived, angle, format });
  const type = format === 'glb' ? 'model/gltf-binary' : 'model/stl';
  const address = URL.createObjectURL(new Blob([bytes], { type }));
  const link = document.createElement('a');
  link.href = address;
  link.download = format === 'glb' ? 'assembly_metres.glb' : 'assembly_mm.stl';
  link.click();
  setTimeout(() => URL.revokeObjectURL(address), 60_000);
}
