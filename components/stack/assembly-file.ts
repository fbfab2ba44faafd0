import { GLTFExporter } from 'three/addons/exporters/GLTFExporter.js';
import { STLExporter } from 'three/addons/exporters/STLExporter.js';
import type { Derived } from '@/geometry';
import { assemblyBodies } from './assembly-bodies';

export type AssemblyFormat = 'glb' | 'stl';

/** glTF is in metres by its standard; STL has no unit and is written in mm. */
const METRES = 0.001;

/** The assembly at a shaft angle (rad) as a file's bytes. */
export async function assemblyFile(
  derived: Derived,
  angle: number,
  format: AssemblyFormat,
): Promise<ArrayBuffer> {
  const bodies = assemblyBodies(derived, angle);
  if (format === 'stl') {
    const view = new STLExporter().parse(bodies, { binary: true });
    return view.buffer.slice(view.byteOffset, view.byteOffset + view.byteLength) as ArrayBuffer;
  }
  bodies.scale.setScalar(METRES);
  bodies.updateMatrixWorld(true);
  return (await new GLTFExporter().parseAsync(bodies, { binary: true })) as ArrayBuffer;
}
