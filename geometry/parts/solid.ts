/** The plan of a part's body about its own place: what lies between `from` and `to` of a place. */

import type { Design } from '../design';
import type { Contour } from '../outline';
import { circle } from './contours';
import { STOP_PIN } from './frame';
import type { Part } from './part';

export interface Plan {
  readonly outside: Contour;
  readonly holes: readonly Contour[];
}

/** null for bought parts that have no place: screws, nuts, bushes. */
export function planOf(part: Part, design: Design): Plan | null {
  if (part.kind === 'cut') return part;
  if (part.kind === 'turned') {
    return { outside: circle(part.outerDiameter / 2), holes: [circle(part.boreDiameter / 2)] };
  }
  const diameters: Readonly<Record<string, number>> = {
    shaft: design.shaftDiameter,
    post: design.postHoleDiameter,
    'stop-pin': STOP_PIN,
  };
  const diameter = diameters[part.key];
  return diameter === undefined ? null : { outside: circle(diameter / 2), holes: [] };
}
