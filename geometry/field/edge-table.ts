/**
 * Gains of straight plate edges near other edges, solved once for a ratio of thicknesses to the
 * air gap and then read from a table. Lengths in air gaps; capacitance per unit length of edge,
 * per gap, over ε, without the area term of the overlap.
 */

import { cellHeight, edgeGain, type Cell, type StripKind } from './cross-section';

export interface EdgeTable {
  readonly rotorThickness: number;
  readonly statorThickness: number;
  /** Height of the half cell, air gaps. */
  readonly height: number;
  /** One edge deep inside the other plate's reach. */
  readonly rotorDeep: number;
  readonly statorDeep: number;
  /** How far behind its edge a stack acts as a solid wall on the open space beside it. */
  readonly rotorSetback: number;
  readonly statorSetback: number;
  /** Edges facing opposite ways, the plates overlapping by x ≥ 0: both edges together. */
  readonly overlapping: (x: number) => number;
  /** Edges facing each other x ≥ 0 apart, less what two set-back walls would have. */
  readonly apart: (x: number) => number;
  /** Rotor edge with the stator's edge x ≥ 0 further out on the same side. */
  readonly rotorInside: (x: number) => number;
  /** Stator edge with the rotor's edge x ≥ 0 further out on the same side. */
  readonly statorInside: (x: number) => number;
}

/** Beyond this distance the edges no longer see each other: the fields fall as e^(−πx/height). */
const FAR = 9;
const NODES = 16;

/**
 * A function of x ≥ 0 by cubics through nodes spaced evenly in √x, since it changes fastest
 * near 0, and its limit beyond.
 */
function tabulated(
  at: (x: number) => number,
  limit: (x: number) => number,
): (x: number) => number {
  const step = Math.sqrt(FAR) / (NODES - 1);
  const values = Array.from(
    { length: NODES },
    (_, i) => at((i * step) ** 2) - limit((i * step) ** 2),
  );
  return (x) => {
    const position = Math.sqrt(x) / step;
    if (position >= NODES - 1) return limit(x);
    const i = Math.min(Math.max(Math.floor(position) - 1, 0), NODES - 4);
    const t = position - i;
    const [a, b, c, d] = [values[i]!, values[i + 1]!, values[i + 2]!, values[i + 3]!];
    const cubic =
      (-a * (t - 1) * (t - 2) * (t - 3)) / 6 +
      (b * t * (t - 2) * (t - 3)) / 2 -
      (c * t * (t - 1) * (t - 3)) / 2 +
      (d * t * (t - 1) * (t - 2)) / 6;
    return cubic + limit(x);
  };
}

/** A strip cannot have no length at all: this much stands for touching, in gaps. */
const TOUCHING = 1e-4;

/** @param rotorThickness in air gaps @param statorThickness in air gaps */
export function edgeTable(rotorThickness: number, statorThickness: number): EdgeTable {
  const cell: Cell = { airGap: 1, rotorThickness, statorThickness };
  const height = cellHeight(cell);
  const on = Infinity;
  const rotorDeep = edgeGain(cell, ['both', 'stator'])([on, on]);
  const statorDeep = edgeGain(cell, ['rotor', 'both'])([on, on]);
  const reach = 4 * height;
  const rotorSetback =
    height / edgeGain(cell, ['rotor', 'open'], [null, 0])([on, reach]) - reach;
  const statorSetback =
    height / edgeGain(cell, ['open', 'stator'], [1, null])([reach, on]) - reach;
  const chain = (left: StripKind, middle: StripKind, right: StripKind) => {
    const gain = edgeGain(cell, [left, middle, right]);
    return (x: number): number => gain([on, Math.max(x, TOUCHING), on]);
  };
  const walls = (x: number): number => height / (x + rotorSetback + statorSetback);
  const facing = chain('rotor', 'open', 'stator');
  return {
    rotorThickness,
    statorThickness,
    height,
    rotorDeep,
    statorDeep,
    rotorSetback,
    statorSetback,
    overlapping: tabulated(chain('rotor', 'both', 'stator'), () => rotorDeep + statorDeep),
    apart: tabulated(
      (x) => facing(x) - walls(x),
      () => 0,
    ),
    rotorInside: tabulated(chain('both', 'stator', 'open'), () => rotorDeep),
    statorInside: tabulated(chain('both', 'rotor', 'open'), () => statorDeep),
  };
}
