/** The 3D files of the assembly, read back by their own formats' rules. */
import { expect, test, vi } from 'vitest';
import { assemblyFile } from '@/components/stack/assembly-file';
import { defaultDesign, derive } from '@/geometry';
import { assemblyOf } from '@/geometry/parts/assembly';

const derivation = derive(defaultDesign(), { model: 'edges' });
if (!derivation.ok) throw new Error('no plates');
const { derived } = derivation;

type Corner = readonly [number, number, number];

/** Triangles of a binary STL (80 bytes, count, 50 bytes each). */
function trianglesOf(bytes: ArrayBuffer): (readonly [Corner, Corner, Corner])[] {
  const view = new DataView(bytes);
  const count = view.getUint32(80, true);
  expect(bytes.byteLength).toBe(84 + 50 * count);
  return Array.from({ length: count }, (_, i) => {
    const at = (k: number): number => view.getFloat32(84 + 50 * i + 12 + 4 * k, true);
    return [0, 3, 6].map((k) => [at(k), at(k + 1), at(k + 2)]) as unknown as readonly [
      Corner,
      Corner,
      Corner,
    ];
  });
}

/** Volume inside triangles, mm³. */
function volumeOf(bytes: ArrayBuffer): number {
  return trianglesOf(bytes).reduce(
    (volume, [a, b, c]) =>
      volume +
      (a[0] * (b[1] * c[2] - b[2] * c[1]) -
        a[1] * (b[0] * c[2] - b[2] * c[0]) +
        a[2] * (b[0] * c[1] - b[1] * c[0])) /
        6,
    0,
  );
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
  // Chords keep the area of their arc; corners are 32-bit numbers.
  expect(Math.abs(volume / expected - 1)).toBeLessThan(1e-4);
});

test('every side of the STL belongs to two triangles, which run along it opposite ways', async () => {
  const sides = new Map<string, number>();
  for (const triangle of trianglesOf(await assemblyFile(derived, 1, 'stl'))) {
    triangle.forEach((corner, i) => {
      const [from, to] = [corner.join(), triangle[(i + 1) % 3]!.join()];
      const [key, way] = from < to ? [`${from} ${to}`, 1] : [`${to} ${from}`, -1];
      sides.set(key, (sides.get(key) ?? 0) + way);
    });
  }
  expect([...sides.values()].filter((sum) => sum !== 0)).toEqual([]);
});

interface Gltf {
  readonly nodes: readonly {
    readonly mesh?: number;
    readonly name?: string;
    readonly matrix?: readonly number[];
    readonly children?: readonly number[];
  }[];
  readonly meshes: readonly {
    readonly primitives: readonly { readonly attributes: { readonly POSITION: number } }[];
  }[];
  readonly accessors: readonly { readonly min: number[]; readonly max: number[] }[];
}

/** The JSON chunk of a binary glTF of version 2. */
async function gltfAt(angle: number): Promise<Gltf> {
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
  vi.stubGlobal('FileReader', Reader);
  const bytes = await assemblyFile(derived, angle, 'glb');
  const view = new DataView(bytes);
  expect(view.getUint32(0, true)).toBe(0x46546c67);
  expect(view.getUint32(4, true)).toBe(2);
  expect(view.getUint32(8, true)).toBe(bytes.byteLength);
  const length = view.getUint32(12, true);
  return JSON.parse(new TextDecoder().decode(new Uint8Array(bytes, 20, length))) as Gltf;
}

const nodeOf = ({ nodes }: Gltf, name: string): Gltf['nodes'][number] =>
  nodes.find((node) => node.name === name)!;

test('the glTF has a body for each place, equal ones with the same shape, in metres', async () => {
  const gltf = await gltfAt(0);
  const { placed } = assemblyOf(derived);
  expect(gltf.nodes.filter(({ mesh }) => mesh !== undefined)).toHaveLength(placed.length);
  expect(gltf.meshes.length).toBeLessThan(placed.length / 2);
  // The parent of all turns mm into m; a shape keeps the kernel's mm.
  const parent = gltf.nodes.find(({ children }) => children?.length === placed.length)!;
  expect([0, 5, 10].map((i) => parent.matrix![i])).toEqual([0.001, 0.001, 0.001]);
  const { mesh } = nodeOf(gltf, 's1-rotor-1');
  const shape = gltf.accessors[gltf.meshes[mesh!]!.primitives[0]!.attributes.POSITION]!;
  const { rotor, sweepRadius } = derived.sections[0]!;
  expect(shape.max[2]! - shape.min[2]!).toBeCloseTo(rotor.thickness, 5);
  expect(
    Math.max(...shape.max.slice(0, 2), ...shape.min.slice(0, 2).map(Math.abs)),
  ).toBeLessThan(sweepRadius + 0.01);
});

test('the rotor is turned by the shaft’s angle, and the stator is not', async () => {
  const [open, meshed] = await Promise.all([gltfAt(0), gltfAt(derived.turn.travel)]);
  const bearing = (gltf: Gltf, name: string): number => {
    const matrix = nodeOf(gltf, name).matrix ?? [1, 0];
    return Math.atan2(matrix[1]!, matrix[0]!);
  };
  const turned = (name: string): number => {
    const by = bearing(meshed, name) - bearing(open, name);
    return ((by % (2 * Math.PI)) + 2 * Math.PI) % (2 * Math.PI);
  };
  const { travel, direction } = derived.turn;
  expect(turned('s1-rotor-1')).toBeCloseTo(direction === 1 ? travel : 2 * Math.PI - travel, 6);
  expect(turned('s1-stator-1')).toBe(0);
});
