/** The same parts laid out as boxes by a general-purpose packer, to compare with. */
import {
  MaxRectsPacker,
  Rectangle,
  type PACKING_LOGIC,
} from 'maxrects-packer/dist/maxrects-packer.mjs';
import type { Contour } from '../../geometry';
import { contourBounds } from '../../geometry/measure';
import type { LayoutSettings, Piece } from '../../geometry/nesting/layout';
import { placedContour } from '../../geometry/nesting/placed';

/** Smallest box of a contour over all bearings by whole degrees, mm. */
function smallestBox(outside: Contour): [number, number] {
  let best: [number, number] = [0, 0];
  let area = Infinity;
  for (let degree = 0; degree < 180; degree++) {
    const turned = placedContour(outside, { x: 0, y: 0, angle: (degree * Math.PI) / 180 });
    const { minX, minY, maxX, maxY } = contourBounds(turned);
    const size = (maxX - minX) * (maxY - minY);
    if (size < area) [area, best] = [size, [maxX - minX, maxY - minY]];
  }
  return best;
}

/**
 * Length of the shortest sheet of a given height on which all boxes fit, mm, to 0.1 mm: the best
 * of the packer's ways, boxes turned by quarters as it likes.
 */
export function boxLength(
  pieces: readonly Piece[],
  height: number,
  { gap, margin }: LayoutSettings,
): number {
  const boxes = pieces.flatMap(({ outside, quantity }) => {
    const box = smallestBox(outside);
    return Array.from({ length: quantity }, () => box);
  });
  const fits = (length: number): boolean =>
    [0, 1, 2].some((logic) => {
      const packer = new MaxRectsPacker(length - 2 * margin, height - 2 * margin, gap, {
        smart: false,
        pot: false,
        square: false,
        allowRotation: true,
        logic: logic as PACKING_LOGIC,
      });
      packer.addArray(boxes.map(([w, h]) => new Rectangle(w, h)));
      const [bin, ...more] = packer.bins;
      return more.length === 0 && bin!.rects.length === boxes.length && !('oversized' in bin!);
    });
  let low = 2 * margin;
  let high = 2 * margin + 10;
  while (!fits(high)) [low, high] = [high, 1.5 * high];
  while (high - low > 0.1) {
    const middle = (low + high) / 2;
    if (fits(middle)) high = middle;
    else low = middle;
  }
  return high;
}
