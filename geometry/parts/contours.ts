/** Contours of the simpler parts. */

import type { Circle, Path, Point, Vertex } from '../outline';
import { arcVertices } from '../polar';

export const circle = (radius: number, { x, y }: Point = { x: 0, y: 0 }): Circle => ({
  kind: 'circle',
  x,
  y,
  radius,
});

/** Convex hull, counter-clockwise (A. M. Andrew's monotone chain, 1979, from memory). */
function hullOf(points: readonly Point[]): Point[] {
  const sorted = [...points].sort((a, b) => a.x - b.x || a.y - b.y);
  const turns = (a: Point, b: Point, c: Point): number =>
    (b.x - a.x) * (c.y - a.y) - (b.y - a.y) * (c.x - a.x);
  const half = (from: readonly Point[]): Point[] => {
    const chain: Point[] = [];
    for (const point of from) {
      while (chain.length > 1 && turns(chain.at(-2)!, chain.at(-1)!, point) <= 1e-9)
        chain.pop();
      chain.push(point);
    }
    return chain.slice(0, -1);
  };
  return [...half(sorted), ...half(sorted.reverse())];
}

/** The outline of equal discs with a string drawn round them. At least two centres apart. */
export function roundedHull(centres: readonly Point[], radius: number): Path {
  const hull = hullOf(centres);
  const n = hull.length;
  const bearing = (a: Point, b: Point): number => Math.atan2(b.y - a.y, b.x - a.x);
  const vertices = hull.flatMap((point, i): Vertex[] => {
    const before = bearing(hull[(i + n - 1) % n]!, point) - Math.PI / 2;
    const after = bearing(point, hull[(i + 1) % n]!) - Math.PI / 2;
    const sweep = (((after - before) % (2 * Math.PI)) + 2 * Math.PI) % (2 * Math.PI);
    const at = (angle: number, bulge: number): Vertex => ({
      x: point.x + radius * Math.cos(angle),
      y: point.y + radius * Math.sin(angle),
      bulge,
    });
    return [at(before, Math.tan(sweep / 4)), at(after, 0)];
  });
  return { kind: 'path', vertices };
}

/** A disc with an arm of even width along +x. */
export function armOutline(boss: number, reach: number, width: number): Path {
  const half = width / 2;
  const meets = Math.asin(half / boss);
  const root = boss * Math.cos(meets);
  return {
    kind: 'path',
    vertices: [
      { x: root, y: -half, bulge: 0 },
      { x: reach, y: -half, bulge: 0 },
      { x: reach, y: half, bulge: 0 },
      ...arcVertices(boss, meets, 2 * Math.PI - 2 * meets),
    ],
  };
}

/** A rectangle with round corners, its middle at a point. */
export function roundedRectangle(
  { x, y }: Point,
  width: number,
  height: number,
  corner: number,
): Path {
  const w = width / 2 - corner;
  const h = height / 2 - corner;
  const quarter = Math.tan(Math.PI / 8);
  const at = (px: number, py: number, bulge: number): Vertex => ({
    x: x + px,
    y: y + py,
    bulge,
  });
  return {
    kind: 'path',
    vertices: [
      at(-w, -h - corner, 0),
      at(w, -h - corner, quarter),
      at(w + corner, -h, 0),
      at(w + corner, h, quarter),
      at(w, h + corner, 0),
      at(-w, h + corner, quarter),
      at(-w - corner, h, 0),
      at(-w - corner, -h, quarter),
    ],
  };
}
