import { BufferGeometry, Float32BufferAttribute, ShapeUtils, Vector2 } from 'three';
import type { Contour } from '@/geometry';
import { flatten } from '@/geometry/flatten';

/** Largest distance of a chord from its arc, as a share of the plate's reach: below a pixel. */
const CHORD_SHARE = 0.002;

function corners(contour: Contour, sagitta: number): Vector2[] {
  const flat = flatten(contour, sagitta);
  return Array.from(
    { length: flat.length / 2 },
    (_, i) => new Vector2(flat[2 * i], flat[2 * i + 1]),
  );
}

/** Farthest that a contour's corners come from where it is drawn about, mm. */
export function reach(contour: Contour): number {
  if (contour.kind === 'circle') return Math.hypot(contour.x, contour.y) + contour.radius;
  return contour.vertices.reduce((most, { x, y }) => Math.max(most, Math.hypot(x, y)), 0);
}

/**
 * One plate as a body with its middle at z = 0, mm. The caller disposes of it.
 * @param sagitta largest distance of a chord from its arc, mm; without it, what a picture needs
 */
export function plateGeometry(
  {
    outside,
    holes,
    thickness,
  }: {
    readonly outside: Contour;
    readonly holes: readonly Contour[];
    readonly thickness: number;
  },
  sagitta = CHORD_SHARE * reach(outside),
): BufferGeometry {
  const rim = corners(outside, sagitta);
  // Holes run the other way round, so that their walls, too, face away from the metal.
  const bores = holes.map((hole) => corners(hole, sagitta / 4).reverse());
  const points = [rim, ...bores].flat();
  const half = thickness / 2;
  const position: number[] = [];
  const push = ({ x, y }: Vector2, z: number): void => void position.push(x, y, z);
  for (const [a, b, c] of ShapeUtils.triangulateShape(rim, bores) as [
    number,
    number,
    number,
  ][]) {
    for (const k of [a, b, c]) push(points[k]!, half);
    for (const k of [c, b, a]) push(points[k]!, -half);
  }
  for (const ring of [rim, ...bores]) {
    ring.forEach((from, i) => {
      const to = ring[(i + 1) % ring.length]!;
      push(from, -half);
      push(to, -half);
      push(to, half);
      push(from, -half);
      push(to, half);
      push(from, half);
    });
  }
  const geometry = new BufferGeometry();
  geometry.setAttribute('position', new Float32BufferAttribute(position, 3));
  // No corner is shared, so normals stay those of the flat sides.
  geometry.computeVertexNormals();
  return geometry;
}
