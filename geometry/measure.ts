/** Areas, lengths and extents of contours. Exact for lines and arcs. */

import { TWO_PI } from './constants';
import { arcOf, walk, type Contour, type OutlineSink } from './outline';

/** Area inside a contour, mm²; negative when it runs clockwise. */
export function contourArea(contour: Contour): number {
  if (contour.kind === 'circle') return Math.PI * contour.radius ** 2;
  const { vertices } = contour;
  let area = 0;
  vertices.forEach((a, i) => {
    const b = vertices[(i + 1) % vertices.length]!;
    area += (a.x * b.y - b.x * a.y) / 2;
    if (a.bulge !== 0) {
      const { radius, sweep } = arcOf(a, b, a.bulge);
      area += (radius * radius * (sweep - Math.sin(sweep))) / 2;
    }
  });
  return area;
}

/** Length of a contour, mm. */
export function contourLength(contour: Contour): number {
  let length = 0;
  let at = { x: 0, y: 0 };
  const go = (x: number, y: number): void => {
    at = { x, y };
  };
  const sink: OutlineSink = {
    move: go,
    line: (x, y) => {
      length += Math.hypot(x - at.x, y - at.y);
      go(x, y);
    },
    arc: (x, y, _centre, radius, _start, sweep) => {
      length += radius * Math.abs(sweep);
      go(x, y);
    },
    circle: (_x, _y, radius) => {
      length += TWO_PI * radius;
    },
    close: () => undefined,
  };
  walk(contour, sink);
  return length;
}

export interface Bounds {
  readonly minX: number;
  readonly minY: number;
  readonly maxX: number;
  readonly maxY: number;
}

/** Smallest upright box round a contour, mm. */
export function contourBounds(contour: Contour): Bounds {
  let [minX, minY, maxX, maxY] = [Infinity, Infinity, -Infinity, -Infinity];
  const include = (x: number, y: number): void => {
    minX = Math.min(minX, x);
    minY = Math.min(minY, y);
    maxX = Math.max(maxX, x);
    maxY = Math.max(maxY, y);
  };
  walk(contour, {
    move: include,
    line: include,
    arc: (x, y, centre, radius, start, sweep) => {
      include(x, y);
      const from = Math.min(start, start + sweep);
      const to = Math.max(start, start + sweep);
      for (let k = Math.ceil(from / (Math.PI / 2)); k * (Math.PI / 2) < to; k++) {
        const angle = (k * Math.PI) / 2;
        include(centre.x + radius * Math.cos(angle), centre.y + radius * Math.sin(angle));
      }
    },
    circle: (x, y, radius) => {
      include(x - radius, y - radius);
      include(x + radius, y + radius);
    },
    close: () => undefined,
  });
  return { minX, minY, maxX, maxY };
}

/** Largest distance of a contour from the shaft (the origin), mm. */
export function contourReach(contour: Contour): number {
  let reach = 0;
  const include = (x: number, y: number): void => {
    reach = Math.max(reach, Math.hypot(x, y));
  };
  walk(contour, {
    move: include,
    line: include,
    arc: (x, y, centre, radius, start, sweep) => {
      include(x, y);
      // Furthest where the arc crosses the ray from the origin through its centre.
      const away = Math.atan2(centre.y, centre.x);
      const along = ((Math.sign(sweep) * (away - start)) % TWO_PI) + TWO_PI;
      if (along % TWO_PI <= Math.abs(sweep)) {
        reach = Math.max(reach, Math.hypot(centre.x, centre.y) + radius);
      }
    },
    circle: (x, y, radius) => {
      reach = Math.max(reach, Math.hypot(x, y) + radius);
    },
    close: () => undefined,
  });
  return reach;
}
