/**
 * DXF of cut contours: millimetres, closed LWPOLYLINEs with true arcs, circles as circles.
 * Group codes from the DXF reference: $INSUNITS 4 is millimetres, LWPOLYLINE 42 is the bulge.
 */

import Drawing from 'dxf-writer';
import Handle from 'dxf-writer/src/Handle';
import type { Contour } from '../outline';
import { contourBounds } from '../measure';
import type { Placement } from './placement';

/** mm; far below any machine's step, and it keeps numbers like 1e-15 out of the file. */
const COORDINATE_DIGITS = 6;
const BULGE_DIGITS = 12;

/** What a person should know, and no machine cuts. */
const NOTES = 'NOTES';

function rounded(value: number, digits: number): number {
  // Adding 0 turns −0 into 0.
  return Number(value.toFixed(digits)) + 0;
}

function draw(drawing: Drawing, contour: Contour, dx: number, dy: number): void {
  const at = (value: number): number => rounded(value, COORDINATE_DIGITS);
  if (contour.kind === 'circle') {
    drawing.drawCircle(at(contour.x + dx), at(contour.y + dy), at(contour.radius));
    return;
  }
  // The library takes the bulge as a third item of a point; its types name only two.
  const points = contour.vertices.map(
    ({ x, y, bulge }) => [at(x + dx), at(y + dy), rounded(bulge, BULGE_DIGITS)] as const,
  );
  drawing.drawPolyline(points as unknown as [number, number][], true);
}

/**
 * One DXF of the parts as placed. Each part has two layers of its own: outer cut and inner cut.
 * Words stand on a layer that is not cut. Whether kerf is allowed for is in the contours it is given, and in its name.
 */
export function dxfOf(placements: readonly Placement[]): string {
  // The library counts handles over the whole process; from 0, equal designs give equal bytes.
  Handle.seed = 0;
  const drawing = new Drawing();
  drawing.setUnits('Millimeters');
  drawing.header('MEASUREMENT', [[70, 1]]);
  drawing.addLayer(NOTES, Drawing.ACI.LAYER, 'CONTINUOUS');
  for (const { part, dx, dy } of placements) {
    const key = part.key.toUpperCase();
    const outer = `${key}-OUTER-CUT`;
    const inner = `${key}-INNER-CUT`;
    drawing.addLayer(outer, Drawing.ACI.LAYER, 'CONTINUOUS');
    drawing.addLayer(inner, Drawing.ACI.LAYER, 'CONTINUOUS');
    drawing.setActiveLayer(inner);
    for (const hole of part.holes) draw(drawing, hole, dx, dy);
    drawing.setActiveLayer(outer);
    draw(drawing, part.outside, dx, dy);
    if (!part.words) continue;
    const { minX, minY } = contourBounds(part.outside);
    drawing.setActiveLayer(NOTES);
    drawing.drawText(rounded(minX + dx, 3), rounded(minY + dy - 6, 3), 3, 0, part.words);
  }
  return drawing.toDxfString();
}
