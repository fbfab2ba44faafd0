/** Plates for a rotor that meshes clockwise: the same contours, mirrored in the x axis. */

import type { Circle, Path, Point } from './outline';

export function mirrorPoint<P extends Point>(point: P): P {
  return { ...point, y: -point.y };
}

export function mirrorCircle(circle: Circle): Circle {
  return mirrorPoint(circle);
}

/** Runs counter-clockwise again: the order is turned round, and each bulge moves with its side. */
export function mirrorPath({ vertices }: Path): Path {
  const n = vertices.length;
  return {
    kind: 'path',
    vertices: vertices.map((_, i) => {
      const vertex = vertices[n - 1 - i]!;
      const side = vertices[(2 * n - 2 - i) % n]!;
      return { x: vertex.x, y: -vertex.y, bulge: side.bulge };
    }),
  };
}
