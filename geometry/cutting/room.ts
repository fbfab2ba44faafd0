/** How much of a sheet a machine reaches, and whether a part has room on it. mm */

import { contourBounds } from '../measure';
import { placedContour } from '../nesting/placed';
import type { Contour } from '../outline';
import type { CuttingFinding } from './cutting-finding';
import type { Machine, Sheet } from './machine';
import type { CutPart } from '../parts/part';
import { formatQuantity } from '../quantity';

export interface Size {
  readonly width: number;
  readonly height: number;
}

/** What can be cut of a sheet: the bed limits it, whichever way the sheet lies. */
export function reachable(
  sheet: Pick<Sheet, 'width' | 'height'>,
  bed: Pick<Machine, 'bedWidth' | 'bedHeight'>,
): Size {
  const along = {
    width: Math.min(sheet.width, bed.bedWidth),
    height: Math.min(sheet.height, bed.bedHeight),
  };
  const across = {
    width: Math.min(sheet.width, bed.bedHeight),
    height: Math.min(sheet.height, bed.bedWidth),
  };
  return along.width * along.height >= across.width * across.height ? along : across;
}

/** rad. A part is tried at each of these bearings. */
const STEP = Math.PI / 180;

/** The part's box at the bearing at which it needs least of a room, turned to lie as the room does. */
function boxIn(outside: Contour, room: Size): Size & { need: number } {
  let best = { width: Infinity, height: Infinity, need: Infinity };
  for (let k = 0; k < 180; k++) {
    const { minX, minY, maxX, maxY } = contourBounds(
      placedContour(outside, { x: 0, y: 0, angle: k * STEP }),
    );
    const width = maxX - minX;
    const height = maxY - minY;
    const need = Math.max(width / room.width, height / room.height);
    if (need < best.need) best = { width, height, need };
  }
  return best;
}

/** @param room what is left of bed and sheet inside the margins */
export function sizeFinding(part: CutPart, room: Size, margin: number): CuttingFinding {
  const box = boxIn(part.outside, room);
  const wide = box.width / room.width >= box.height / room.height;
  const fits = box.need <= 1;
  const whole = (value: number): string =>
    formatQuantity(Math.ceil(value + 2 * margin), 'length', 5);
  return {
    code: 'part-large',
    severity: fits ? 'ok' : 'fail',
    part: part.key,
    label: `Room on bed and sheet, ${part.label.toLowerCase()}`,
    value: wide ? box.width : box.height,
    limit: wide ? room.width : room.height,
    quantity: 'length',
    change: fits
      ? ''
      : `It needs bed and sheet of ${whole(box.width)} by ${whole(box.height)}: take larger ones, or a smaller largest radius.`,
  };
}
