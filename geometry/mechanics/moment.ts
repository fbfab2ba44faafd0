/** First moment of contours about the shaft. Exact for lines and arcs. */

import { contourArea } from '../measure';
import { arcOf, type Contour, type Point } from '../outline';

/** ∫x dA and ∫y dA inside a contour, mm³; negative areas where it runs clockwise. */
export function contourMoment(contour: Contour): Point {
  if (contour.kind === 'circle') {
    const area = contourArea(contour);
    return { x: area * contour.x, y: area * contour.y };
  }
  const { vertices } = contour;
  let [x, y] = [0, 0];
  vertices.forEach((a, i) => {
    const b = vertices[(i + 1) % vertices.length]!;
    const cross = a.x * b.y - b.x * a.y;
    x += ((a.x + b.x) * cross) / 6;
    y += ((a.y + b.y) * cross) / 6;
    if (a.bulge === 0) return;
    // Segment between chord and arc: its area at the centre, and 2/3·r³·sin³(sweep/2) beyond it.
    const { centre, radius, startAngle, sweep } = arcOf(a, b, a.bulge);
    const area = (radius * radius * (sweep - Math.sin(sweep))) / 2;
    const beyond = (2 / 3) * radius ** 3 * Math.sin(sweep / 2) ** 3;
    const middle = startAngle + sweep / 2;
    x += area * centre.x + beyond * Math.cos(middle);
    y += area * centre.y + beyond * Math.sin(middle);
  });
  return { x, y };
}
