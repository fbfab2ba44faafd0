/**
 * Estimate of the capacitance between the stators of neighbouring sections: the plates that look
 * at each other as a parallel pair, rims and earthed rotor left out. Right in its order of
 * magnitude; to be measured on a built one.
 */

import { areaD, intersectD, FillRule, type PathD } from 'clipper2-ts';
import { EPSILON_0 } from '../constants';
import type { Derived } from '../derived';
import { flatten } from '../flatten';
import type { Contour } from '../outline';
import { FLATTENING } from '../tolerances';

export interface Coupling {
  /** The two sections, by index. */
  readonly sections: readonly [number, number];
  /** Between the stator plates that look at each other, mm, and what they share in plan, mm². */
  readonly distance: number;
  readonly area: number;
  /** Without a screen, F. */
  readonly open: number;
  /** With an earthed screen half way that reaches {@link reach} beyond both plates, F. */
  readonly screened: number;
  /** How far the screen reaches, mm: half the distance. */
  readonly reach: number;
}

function polygonOf(contour: Contour): PathD {
  const flat = flatten(contour, FLATTENING);
  return Array.from({ length: flat.length / 2 }, (_, i) => ({
    x: flat[2 * i]!,
    y: flat[2 * i + 1]!,
    z: 0,
  }));
}

/** Decimals of a millimetre that are kept in clipping. */
const DIGITS = 5;

/** Between each section and the next. */
export function couplingsOf({ sections, stack }: Derived): readonly Coupling[] {
  return sections.slice(1).map((next, i): Coupling => {
    const stators = stack.plates.filter(({ role }) => role === 'stator');
    const faces = (index: number, side: 1 | -1): number[] =>
      stators
        .filter(({ section }) => section === index)
        .map(({ z, thickness }) => z + (side * thickness) / 2);
    const distance = Math.min(...faces(i + 1, -1)) - Math.max(...faces(i, 1));
    const shared = intersectD(
      [polygonOf(sections[i]!.stator.outside)],
      [polygonOf(next.stator.outside)],
      FillRule.NonZero,
      DIGITS,
    );
    const area = Math.abs(shared.reduce((sum, path) => sum + areaD(path), 0));
    const open = (EPSILON_0 * area) / distance;
    const reach = distance / 2;
    // Between earthed plates half the distance apart the field falls as exp(−π·x/(distance/2)):
    // the lowest mode of the gap that it has to pass on either side of the screen.
    const screened = open * Math.exp((-2 * Math.PI * reach) / (distance / 2));
    return { sections: [i, i + 1], distance, area, open, screened, reach };
  });
}
