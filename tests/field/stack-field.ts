import { solve, type SymmetricMatrix } from './conjugate-gradients';
import { part, type PlanMesh } from './plan-mesh';

/** The levels a stack is cut into, along the shaft. */
export interface Levels {
  /** Heights, rising, mm. The first and the last are mirror planes where there is no metal. */
  z: number[];
  /** Which parts have metal at each level: bits of `part`. A part reaches over its levels. */
  mask: Uint8Array;
}

export interface Field {
  /** Twice the field energy at one volt over ε: C/ε, mm. */
  capacitance: number;
  unknowns: number;
  iterations: number;
}

const atRotor = part.rotor | part.shaft;
const rotorCode = -1;
const statorCode = -2;

/**
 * The field between the rotor's and the stator's metal in a stack of prisms.
 *
 * Seven-point differences where the plan is a grid of rectangles. With lumped masses the energy
 * is not below the exact one whatever the grid, as long as the grid carries the metal exactly.
 */
export function stackField(plan: PlanMesh, levels: Levels, fall?: number): Field {
  const height = levels.z.length;
  const weight = new Float64Array(height);
  const rise = new Float64Array(height);
  for (let k = 0; k + 1 < height; k += 1) {
    const dz = levels.z[k + 1]! - levels.z[k]!;
    rise[k] = 1 / dz;
    weight[k] = weight[k]! + dz / 2;
    weight[k + 1] = weight[k + 1]! + dz / 2;
  }
  if (height === 1) weight[0] = 1;

  const code = new Int32Array(plan.count * height);
  let size = 0;
  for (let p = 0; p < plan.count; p += 1) {
    for (let k = 0; k < height; k += 1) {
      const metal = plan.mask[p]! & levels.mask[k]!;
      code[p * height + k] = metal ? (metal & atRotor ? rotorCode : statorCode) : size++;
    }
  }

  // Every bond between two points of the stack once, the later point first.
  const bonds = (visit: (i: number, j: number, value: number) => void) => {
    for (let p = 0; p < plan.count; p += 1) {
      for (let k = 0; k < height; k += 1) {
        const i = p * height + k;
        if (k > 0) visit(i, i - 1, plan.area[p]! * rise[k - 1]!);
        for (let s = plan.start[p]!; s < plan.start[p + 1]!; s += 1) {
          const q = plan.neighbour[s]!;
          if (q < p) visit(i, q * height + k, plan.conductance[s]! * weight[k]!);
        }
      }
    }
  };

  let entries = 0;
  bonds((i, j) => {
    if (code[i]! >= 0 && code[j]! >= 0) entries += 1;
  });
  const matrix: SymmetricMatrix = {
    size,
    diagonal: new Float64Array(size),
    start: new Int32Array(size + 1),
    column: new Int32Array(entries),
    value: new Float64Array(entries),
  };
  const source = new Float64Array(size);
  let at = 0;
  const { diagonal, start, column, value } = matrix;
  bonds((i, j, bond) => {
    const a = code[i]!;
    const b = code[j]!;
    if (a >= 0) {
      diagonal[a] = diagonal[a]! + bond;
      if (b === rotorCode) source[a] = source[a]! + bond;
      if (b >= 0) {
        column[at] = b;
        value[at] = -bond;
        at += 1;
      }
      start[a + 1] = at;
    }
    if (b >= 0) {
      diagonal[b] = diagonal[b]! + bond;
      if (a === rotorCode) source[b] = source[b]! + bond;
    }
  });
  // Rows without earlier neighbours begin where the one before ended.
  for (let i = 0; i < size; i += 1) start[i + 1] = Math.max(start[i + 1]!, start[i]!);

  const { x, iterations } = solve(matrix, source, fall);
  let capacitance = 0;
  const potential = (c: number) => (c >= 0 ? x[c]! : c === rotorCode ? 1 : 0);
  bonds((i, j, bond) => {
    const step = potential(code[i]!) - potential(code[j]!);
    capacitance += bond * step * step;
  });
  return { capacitance, unknowns: size, iterations };
}
