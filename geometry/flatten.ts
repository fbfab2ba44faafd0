import { walk, type Contour } from './outline';
import { polar } from './polar';

/**
 * How far out the inner corners of a flattened arc must stand, as a multiple of its radius, for
 * the polygon to keep the arc's area while its ends stay where they are. Fan of `count` triangles
 * of angle `step`: (count − 2)·k²·sin(step) + 2k·sin(step) = count·step.
 */
function areaKeepingFactor(count: number, step: number): number {
  const wanted = (count * step) / Math.sin(step);
  return wanted / (1 + Math.sqrt(1 + (count - 2) * wanted));
}

/**
 * A contour as a polygon of the same area: corners of an arc lie within `sagitta` of it, some
 * inside, some outside.
 * @param sagitta mm
 * @returns x, y, x, y, …, mm
 */
export function flatten(contour: Contour, sagitta: number): number[] {
  const flat: number[] = [];
  walk(contour, {
    move: (x, y) => flat.push(x, y),
    line: (x, y) => flat.push(x, y),
    arc: (x, y, centre, radius, start, sweep) => {
      const widest = 2 * Math.acos(Math.max(0.5, 1 - sagitta / radius));
      const count = Math.max(2, Math.ceil(Math.abs(sweep) / widest));
      const step = sweep / count;
      const out = radius * areaKeepingFactor(count, Math.abs(step));
      for (let i = 1; i < count; i++) {
        const point = polar(out, start + i * step);
        flat.push(centre.x + point.x, centre.y + point.y);
      }
      flat.push(x, y);
    },
    circle: (x, y, radius) => {
      const count = Math.ceil(Math.PI / Math.acos(Math.max(0.5, 1 - sagitta / radius)));
      const step = (2 * Math.PI) / count;
      const out = radius * Math.sqrt(step / Math.sin(step));
      for (let i = 0; i < count; i++) {
        const point = polar(out, i * step);
        flat.push(x + point.x, y + point.y);
      }
    },
    // A path's last side comes back to its first point, which is there already.
    close: () => flat.splice(-2, 2),
  });
  return flat;
}
