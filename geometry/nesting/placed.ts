/** Contours where a layout puts them. */

import type { Contour, Point } from '../outline';
import type { Placement } from './layout';

/** A contour turned about the origin and then moved. Bulges don't change. */
export function placedContour(
  contour: Contour,
  { x, y, angle }: Pick<Placement, 'x' | 'y' | 'angle'>,
): Contour {
  const cos = Math.cos(angle);
  const sin = Math.sin(angle);
  const moved = (p: Point): Point => ({
    x: p.x * cos - p.y * sin + x,
    y: p.x * sin + p.y * cos + y,
  });
  if (contour.kind === 'circle') return { ...contour, ...moved(contour) };
  return { ...contour, vertices: contour.vertices.map((v) => ({ ...v, ...moved(v) })) };
}
