/**
 * Conjugate gradients with an incomplete-factor preconditioner.
 *
 * The factor keeps the matrix's own off-diagonal entries and a diagonal that keeps row sums
 * almost (Gustafsson, BIT 18, 1978); product and preconditioner share their two triangular
 * sweeps (Eisenstat, SIAM J. Sci. Stat. Comput. 2, 1981).
 */
export interface SymmetricMatrix {
  size: number;
  diagonal: Float64Array;
  /** Entries left of the diagonal: column[start[i] … start[i + 1]) and their values. */
  start: Int32Array;
  column: Int32Array;
  value: Float64Array;
}

/** How much of the dropped fill goes to the diagonal: all of it can meet a zero pivot. */
const kept = 0.9995;

function pivots(m: SymmetricMatrix): Float64Array {
  const { size, start, column, value } = m;
  const pivot = m.diagonal.slice();
  // Sum of the entries right of the diagonal, by row.
  const right = new Float64Array(size);
  for (let i = 0; i < size; i += 1) {
    for (let s = start[i]!; s < start[i + 1]!; s += 1) {
      const j = column[s]!;
      right[j] = right[j]! + value[s]!;
    }
  }
  for (let i = 0; i < size; i += 1) {
    let d = pivot[i]!;
    for (let s = start[i]!; s < start[i + 1]!; s += 1) {
      const j = column[s]!;
      const v = value[s]!;
      d -= (v / pivot[j]!) * (v + kept * (right[j]! - v));
    }
    if (!(d > 0)) throw new Error(`pivot ${d} in row ${i} of ${size}`);
    pivot[i] = d;
  }
  return pivot;
}

/** Solves m·x = b until the residual has fallen by `fall`. Spoils `m` and `b`; x is new. */
export function solve(
  m: SymmetricMatrix,
  b: Float64Array,
  fall = 1e-4,
  most = 5000,
): { x: Float64Array; iterations: number } {
  const { size, start, column, value, diagonal } = m;
  // Scale so that every pivot is one.
  const scale = pivots(m);
  for (let i = 0; i < size; i += 1) scale[i] = 1 / Math.sqrt(scale[i]!);
  for (let i = 0; i < size; i += 1) {
    const si = scale[i]!;
    // What the product needs of the diagonal: itself less the two unit pivots.
    diagonal[i] = diagonal[i]! * si * si - 2;
    b[i] = b[i]! * si;
    for (let s = start[i]!; s < start[i + 1]!; s += 1) {
      value[s] = value[s]! * si * scale[column[s]!]!;
    }
  }
  const forward = (v: Float64Array) => {
    for (let i = 0; i < size; i += 1) {
      let sum = v[i]!;
      for (let s = start[i]!, end = start[i + 1]!; s < end; s += 1) {
        sum -= value[s]! * v[column[s]!]!;
      }
      v[i] = sum;
    }
  };
  const backward = (v: Float64Array) => {
    for (let i = size - 1; i >= 0; i -= 1) {
      const vi = v[i]!;
      for (let s = start[i]!, end = start[i + 1]!; s < end; s += 1) {
        const j = column[s]!;
        v[j] = v[j]! - value[s]! * vi;
      }
    }
  };
  const r = b;
  forward(r);
  const x = new Float64Array(size);
  const p = r.slice();
  const t = new Float64Array(size);
  const q = new Float64Array(size);
  let rr = 0;
  for (let i = 0; i < size; i += 1) rr += r[i]! * r[i]!;
  const goal = rr * fall * fall;
  let iterations = 0;
  while (rr > goal) {
    if (iterations === most) throw new Error(`no convergence in ${most} iterations`);
    t.set(p);
    backward(t);
    for (let i = 0; i < size; i += 1) q[i] = p[i]! + diagonal[i]! * t[i]!;
    forward(q);
    let pq = 0;
    for (let i = 0; i < size; i += 1) {
      q[i] = q[i]! + t[i]!;
      pq += p[i]! * q[i]!;
    }
    const alpha = rr / pq;
    let next = 0;
    for (let i = 0; i < size; i += 1) {
      x[i] = x[i]! + alpha * p[i]!;
      const ri = r[i]! - alpha * q[i]!;
      r[i] = ri;
      next += ri * ri;
    }
    const beta = next / rr;
    rr = next;
    for (let i = 0; i < size; i += 1) p[i] = r[i]! + beta * p[i]!;
    iterations += 1;
  }
  backward(x);
  for (let i = 0; i < size; i += 1) x[i] = x[i]! * scale[i]!;
  return { x, iterations };
}
