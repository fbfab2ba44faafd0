/** First moments of contours, exact for lines and arcs. */

import { contourArea } from '../measure';
import { arcOf, type Contour, type Point } from '../outline';

/** ∫x dA and ∫y dA over what a contour encloses, mm³; negative where it runs clockwise. */
export function contourMoment(contour: Contour): Point {
  if (contour.kind === 'circle') {
    const area = contourArea(contour);
    return { x: area * contour.x, y: area * contour.y };
  }
  const { vertices } = contour;
  let [mx, my] = [0, 0];
  vertices.forEach((a, i) => {
    const b = vertices[(i + 1) % vertices.length]!;
    const cross = a.x * b.y - b.x * a.y;
    mx += (cross * (a.x + b.x)) / 6;
    my += (cross * (a.y + b.y)) / 6;
    if (a.bulge === 0) return;
    // The segment between chord and arc: its first moment about the arc's centre is
    // (2/3)·R³·sin³(sweep/2), along the middle of the arc.
    const { centre, radius, startAngle, sweep } = arcOf(a, b, a.bulge);
    const area = (radius * radius * (sweep - Math.sin(sweep))) / 2;
    const about = (2 / 3) * radius ** 3 * Math.sin(sweep / 2) ** 3;
    const middle = startAngle + sweep / 2;
    mx += area * centre.x + about * Math.cos(middle);
    my += area * centre.y + about * Math.sin(middle);
  });
  return { x: mx, y: my };
}

/** First moment of a face with its holes taken out, mm³. Outlines and holes run alike. */
export function faceMoment(outside: Contour, holes: readonly Contour[]): Point {
  return holes
    .map(contourMoment)
    .reduce((sum, { x, y }) => ({ x: sum.x - x, y: sum.y - y }), contourMoment(outside));
}
