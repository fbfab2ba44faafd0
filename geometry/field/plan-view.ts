/**
 * The field in the plan view: where neither rotor nor stator lies, the potential (the mean over
 * the cell's height) obeys Laplace's equation in two dimensions. Each stack acts on it as a wall
 * of its own potential, set back behind its edge: u + setback·q = potential, with q the flux that
 * leaves the wall. Solved by boundary elements (direct method, constant elements, integrals
 * exact; C. A. Brebbia, "The Boundary Element Method for Engineers", 1978, from memory).
 */

/** A straight element of the boundary; the open space lies to the right going from a to b. */
export interface WallElement {
  readonly ax: number;
  readonly ay: number;
  readonly bx: number;
  readonly by: number;
  /** Potential of the stack behind it, 0 to 1. */
  readonly potential: number;
  readonly setback: number;
}

/** Solves a dense system in place by elimination with row pivoting. */
function solveDense(matrix: Float64Array, right: Float64Array): void {
  const n = right.length;
  for (let k = 0; k < n; k++) {
    let pivot = k;
    for (let i = k + 1; i < n; i++) {
      if (Math.abs(matrix[i * n + k]!) > Math.abs(matrix[pivot * n + k]!)) pivot = i;
    }
    if (pivot !== k) {
      for (let j = k; j < n; j++) {
        const held = matrix[k * n + j]!;
        matrix[k * n + j] = matrix[pivot * n + j]!;
        matrix[pivot * n + j] = held;
      }
      const held = right[k]!;
      right[k] = right[pivot]!;
      right[pivot] = held;
    }
    const row = k * n;
    const diagonal = matrix[row + k]!;
    for (let i = k + 1; i < n; i++) {
      const below = i * n;
      const factor = matrix[below + k]! / diagonal;
      for (let j = k + 1; j < n; j++) matrix[below + j]! -= factor * matrix[row + j]!;
      right[i]! -= factor * right[k]!;
    }
  }
  for (let i = n - 1; i >= 0; i--) {
    let sum = right[i]!;
    for (let j = i + 1; j < n; j++) sum -= matrix[i * n + j]! * right[j]!;
    right[i] = sum / matrix[i * n + i]!;
  }
}

export interface PlanField {
  /**
   * Twice the field's energy over ε, per unit height: the capacitance, where walls have potential
   * 1 or 0.
   */
  readonly energy: number;
  /** Flux that leaves each element into the open space, per length, 1/mm. */
  readonly flux: Float64Array;
}

/** Solves the open space in the unbounded plane. */
export function planField(elements: readonly WallElement[]): PlanField {
  const n = elements.length;
  const size = n + 1;
  const matrix = new Float64Array(size * size);
  const right = new Float64Array(size);
  const lengths = elements.map((e) => Math.hypot(e.bx - e.ax, e.by - e.ay));
  for (let i = 0; i < n; i++) {
    const own = elements[i]!;
    const px = (own.ax + own.bx) / 2;
    const py = (own.ay + own.by) / 2;
    right[i] = own.potential / 2;
    for (let j = 0; j < n; j++) {
      const e = elements[j]!;
      const length = lengths[j]!;
      // Coordinates along and across the element, seen from its start.
      const tx = (e.bx - e.ax) / length;
      const ty = (e.by - e.ay) / length;
      const along = (px - e.ax) * tx + (py - e.ay) * ty;
      const across = (py - e.ay) * tx - (px - e.ax) * ty;
      const before = -along;
      const after = length - along;
      let single: number;
      let double = 0;
      if (i === j) {
        single = length * (1 - Math.log(length / 2));
      } else {
        const angle = Math.atan2(across * length, across * across + before * after);
        const logs =
          (after * Math.log(after * after + across * across) -
            before * Math.log(before * before + across * across)) /
          2;
        single = length - logs - across * angle;
        // The outward normal of the open space points into the metal, to the left.
        double = angle;
      }
      single /= 2 * Math.PI;
      double /= 2 * Math.PI;
      matrix[i * size + j] = single + double * e.setback;
      right[i]! += double * e.potential;
    }
    matrix[i * size + i]! += own.setback / 2;
    matrix[i * size + n] = 1;
    matrix[n * size + i] = lengths[i]!;
  }
  solveDense(matrix, right);
  let energy = 0;
  for (let i = 0; i < n; i++) energy += elements[i]!.potential * right[i]! * lengths[i]!;
  return { energy, flux: right.subarray(0, n) };
}
