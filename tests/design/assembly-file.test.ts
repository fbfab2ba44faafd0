/** The 3D files of the assembly, read back by their own formats' rules. */
import { expect, test } from 'vitest';
import { assemblyFile } from '@/components/stack/assembly-file';
import { defaultDesign, derive } from '@/geometry';
import { assemblyOf } from '@/geometry/parts/assembly';

const derivation = derive(defaultDesign(), { model: 'edges' });
if (!derivation.ok) throw new Error('no plates');
const { derived } = derivation;

/** Volume inside the triangles of a binary STL (80 bytes, count, 50 bytes each), mm³. */
function volumeOf(bytes: ArrayBuffer): number {
  const view = new DataView(bytes);
  const count = view.getUint32(80, true);
  expect(bytes.byteLength).toBe(84 + 50 * count);
  let volume = 0;
  for (let i = 0; i < count; i++) {
    const at = (k: number): number => view.getFloat32(84 + 50 * i + 12 + 4 * k, true);
    const [a, b, c] = [0, 3, 6].map((k) => [at(k), at(k + 1), at(k + 2)] as const) as [
      readonly [number, number, number],
      readonly [number, number, number],
      readonly [number, number, number],
    ];
    volume +=
      (a[0] * (b[1] * c[2] - b[2] * c[1]) -
        a[1] * (b[0] * c[2] - b[2] * c[0]) +
        a[2] * (b[0] * c[1] - b[1] * c[0])) /
      6;
  }
  return volume;
}

test('the STL holds the volume of all parts, mm', async () => {
  const { parts, placed } = assemblyOf(derived);
  const rod = (key: string, diameter: number): number =>
    placed
      .filter(({ part }) => part === key)
      .reduce((sum, { from, to }) => sum + (Math.PI / 4) * diameter ** 2 * (to - from), 0);
  const { design } = derived;
  const bodies = parts.reduce((sum, part) => {
    if (part.kind === 'cut') return sum + part.area * part.thickness * part.quantity;
    if (part.kind !== 'turned') return sum;
    const section = (Math.PI / 4) * (part.outerDiameter ** 2 - part.boreDiameter ** 2);
    return sum + section * part.length * part.quantity;
  }, 0);
  const expected =
    bodies +
    rod('shaft', design.shaftDiameter) +
    rod('post', design.postHoleDiameter) +
    rod('stop-pin', 3);
  const volume = volumeOf(await assemblyFile(derived, 1, 'stl'));
  // Arcs are drawn by chords here.
  expect(Math.abs(volume / expected - 1)).toBeLessThan(0.02);
});

test('the glTF is a binary one of version 2 with a body for each place, in metres', async () => {
  // FileReader is the browser's; the exporter reads its own blob with it.
  class Reader {
    result: ArrayBuffer | null = null;
    onloadend: (() => void) | null = null;
    readAsArrayBuffer(blob: Blob): void {
      void blob.arrayBuffer().then((bytes) => {
        this.result = bytes;
        this.onloadend?.();
      });
    }
  }
  Object.assign(globalThis, { FileReader: Reader });
  const bytes = await assemblyFile(derived, 0, 'glb');
  const view = new DataView(bytes);
  expect(view.getUint32(0, true)).toBe(0x46546c67);
  expect(view.getUint32(4, true)).toBe(2);
  const length = view.getUint32(12, true);
  const json = JSON.parse(new TextDecoder().decode(new Uint8Array(bytes, 20, length))) as {
    nodes: { mesh?: number; scale?: number[]; name?: string }[];
    meshes: unknown[];
  };
  const { placed } = assemblyOf(derived);
  expect(json.nodes.filter(({ mesh }) => mesh !== undefined)).toHaveLength(placed.length);
  expect(json.meshes.length).toBeLessThan(placed.length / 2);
});
