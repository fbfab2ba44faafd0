import type { Derived } from '@/geometry';
import type { AssemblyFormat } from './assembly-file';
import type { AssemblyQuestion } from './assembly.worker';

/**
 * Makes the file in a worker, so that what writes it stays out of the screen's own script, and
 * hands it to the browser as a download.
 */
export function saveAssembly(derived: Derived, angle: number, format: AssemblyFormat): void {
  const worker = new Worker(new URL('./assembly.worker.ts', import.meta.url), {
    type: 'module',
  });
  worker.onmessage = ({ data }: MessageEvent<ArrayBuffer>) => {
    worker.terminate();
    const type = format === 'glb' ? 'model/gltf-binary' : 'model/stl';
    const address = URL.createObjectURL(new Blob([data], { type }));
    const link = document.createElement('a');
    link.href = address;
    link.download = format === 'glb' ? 'assembly_metres.glb' : 'assembly_mm.stl';
    link.click();
    setTimeout(() => URL.revokeObjectURL(address), 60_000);
  };
  worker.postMessage({ derived, angle, format } satisfies AssemblyQuestion);
}
