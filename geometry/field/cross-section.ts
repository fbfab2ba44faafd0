/**
 * The cell's cross-section at straight plate edges: a small 2-D Laplace solver by matching modes.
 * The error falls with the square of the number of modes, so that two solutions extrapolate well.
 *
 * Half a cell lies between the middle of a rotor plate (z = 0) and the middle of a stator plate
 * (z = Z), both mirror planes where there is no metal. Rotor at potential 1, stator at 0. Along x
 * the cell is a chain of strips, each with metal of one kind above, below, both or neither; in
 * each the potential is a particular solution plus modes that fall off from its ends. Where two
 * strips meet, the unknowns are the modes of the lower one, which fills the opening exactly.
 *
 * Method: R. Mittra and S. W. Lee, "Analytical Techniques in the Theory of Guided Waves" (1971),
 * mode matching at a step, here for Laplace's equation (from memory).
 */

/** Metal of a strip: rotor below, stator above, both (the overlap) or neither. */
export type StripKind = 'rotor' | 'stator' | 'both' | 'open';

export interface Strip {
  readonly kind: StripKind;
  /** Along x; Infinity for an outermost strip that runs on. */
  readonly length: number;
}

/** Heights of the half cell, all in the same unit. */
export interface Cell {
  readonly airGap: number;
  readonly rotorThickness: number;
  readonly statorThickness: number;
}

export function cellHeight({ airGap, rotorThickness, statorThickness }: Cell): number {
  return airGap + (rotorThickness + statorThickness) / 2;
}

/** Where a strip that does not run on ends: at a wall of this potential. */
export type Wall = 0 | 1 | null;

export interface CrossSection {
  /** Capacitance per unit length of edge over ε, without the area term of the overlap strips. */
  readonly excess: number;
}

interface Field {
  readonly z0: number;
  readonly z1: number;
  /** Wave number and phase of each mode cos(κz + p), normalised over the strip's height. */
  readonly kappa: number[];
  readonly phase: number[];
  readonly scale: number[];
  /** Particular solution: value at z0 and slope. */
  readonly base: number;
  readonly slope: number;
}

/** At fineness 1. Openings get modes by their heights, or the solution converges to nothing. */
const MODES_PER_GAP = 8;

/** For the whole height of a cell, so that very thick plates don't take for ever. */
const MOST_MODES = 24;

function fieldOf(cell: Cell, kind: StripKind, fineness: number): Field {
  const height = cellHeight(cell);
  const z0 = kind === 'rotor' || kind === 'both' ? cell.rotorThickness / 2 : 0;
  const z1 = height - (kind === 'stator' || kind === 'both' ? cell.statorThickness / 2 : 0);
  const h = z1 - z0;
  const density = Math.min(MODES_PER_GAP / cell.airGap, MOST_MODES / height);
  const count = fineness * Math.max(2, Math.round(density * h));
  const kappa: number[] = [];
  const phase: number[] = [];
  const scale: number[] = [];
  for (let k = 0; k < count; k++) {
    const order = kind === 'both' ? k + 1 : kind === 'open' ? k : k + 0.5;
    const wave = (order * Math.PI) / h;
    kappa.push(wave);
    // Sine from the rotor face, cosine from the mirror plane.
    phase.push(-wave * z0 - (kind === 'rotor' || kind === 'both' ? Math.PI / 2 : 0));
    scale.push(order === 0 ? Math.sqrt(1 / h) : Math.sqrt(2 / h));
  }
  const base = kind === 'rotor' || kind === 'both' ? 1 : 0;
  return { z0, z1, kappa, phase, scale, base, slope: kind === 'both' ? -1 / h : 0 };
}

/** ∫ cos(az + p) dz from z0 to z1. */
function integral(a: number, p: number, z0: number, z1: number): number {
  if (Math.abs(a) < 1e-12) return Math.cos(p) * (z1 - z0);
  return (Math.sin(a * z1 + p) - Math.sin(a * z0 + p)) / a;
}

/** ∫ z·cos(az + p) dz from z0 to z1. */
function firstMoment(a: number, p: number, z0: number, z1: number): number {
  if (Math.abs(a) < 1e-12) return (Math.cos(p) * (z1 * z1 - z0 * z0)) / 2;
  const at = (z: number): number =>
    (z * Math.sin(a * z + p)) / a + Math.cos(a * z + p) / (a * a);
  return at(z1) - at(z0);
}

/** Modes of the wider strip in terms of those of the narrower, and what the metal face adds. */
interface Projection {
  /** wide × narrow, row by row. */
  readonly matrix: Float64Array;
  readonly face: Float64Array;
}

function project(wide: Field, narrow: Field): Projection {
  const rows = wide.kappa.length;
  const columns = narrow.kappa.length;
  const matrix = new Float64Array(rows * columns);
  const face = new Float64Array(rows);
  const { z0, z1 } = narrow;
  for (let k = 0; k < rows; k++) {
    const [a, p, sa] = [wide.kappa[k]!, wide.phase[k]!, wide.scale[k]!];
    for (let j = 0; j < columns; j++) {
      const [b, q, sb] = [narrow.kappa[j]!, narrow.phase[j]!, narrow.scale[j]!];
      matrix[k * columns + j] =
        (sa * sb * (integral(a - b, p - q, z0, z1) + integral(a + b, p + q, z0, z1))) / 2;
    }
    // Over the opening: the narrow strip's particular solution; on the faces: the metal's own.
    const offset = narrow.base - narrow.slope * z0;
    let value = offset * integral(a, p, z0, z1) + narrow.slope * firstMoment(a, p, z0, z1);
    if (z0 > wide.z0) value += integral(a, p, wide.z0, z0);
    value -= wide.base * integral(a, p, wide.z0, wide.z1);
    face[k] = sa * value;
  }
  return { matrix, face };
}

/** Energy of a mode over a strip whose end coefficients are u and v: (d·u² − 2c·uv + d·v²). */
function ends(kappa: number, length: number): { own: number; cross: number } {
  if (length === Infinity) return { own: kappa, cross: 0 };
  if (kappa * length < 1e-9) return { own: 1 / length, cross: 1 / length };
  const x = kappa * length;
  if (x > 300) return { own: kappa, cross: 0 };
  return { own: kappa / Math.tanh(x), cross: kappa / Math.sinh(x) };
}

/** Adds the energy of an affine form (rowsᵀ·unknowns + constants) into matrix and right side. */
class Quadratic {
  readonly matrix: Float64Array;
  readonly right: Float64Array;
  constant = 0;

  constructor(readonly size: number) {
    this.matrix = new Float64Array(size * size);
    this.right = new Float64Array(size);
  }

  /** weight · f·g, each f(u) = Σ row[j]·u[from + j] + constant. */
  add(weight: number, f: Affine, g: Affine): void {
    this.constant += weight * f.constant * g.constant;
    for (let i = 0; i < f.row.length; i++) {
      const fi = f.row[i]!;
      this.right[f.from + i]! -= (weight * fi * g.constant) / 2;
      for (let j = 0; j < g.row.length; j++) {
        const half = (weight * fi * g.row[j]!) / 2;
        this.matrix[(f.from + i) * this.size + g.from + j]! += half;
        this.matrix[(g.from + j) * this.size + f.from + i]! += half;
      }
    }
    for (let j = 0; j < g.row.length; j++) {
      this.right[g.from + j]! -= (weight * g.row[j]! * f.constant) / 2;
    }
  }
}

interface Affine {
  readonly from: number;
  readonly row: Float64Array;
  readonly constant: number;
}

/** Solves a symmetric positive system in place by Cholesky's method. */
function solve(matrix: Float64Array, right: Float64Array): Float64Array {
  const n = right.length;
  for (let j = 0; j < n; j++) {
    for (let i = j; i < n; i++) {
      let sum = matrix[i * n + j]!;
      for (let k = 0; k < j; k++) sum -= matrix[i * n + k]! * matrix[j * n + k]!;
      matrix[i * n + j] = i === j ? Math.sqrt(Math.max(sum, 1e-300)) : sum / matrix[j * n + j]!;
    }
  }
  const x = right.slice();
  for (let i = 0; i < n; i++) {
    for (let k = 0; k < i; k++) x[i]! -= matrix[i * n + k]! * x[k]!;
    x[i]! /= matrix[i * n + i]!;
  }
  for (let i = n - 1; i >= 0; i--) {
    for (let k = i + 1; k < n; k++) x[i]! -= matrix[k * n + i]! * x[k]!;
    x[i]! /= matrix[i * n + i]!;
  }
  return x;
}

/**
 * Solves a chain of strips.
 * @param strips from left to right; neighbours differ
 * @param walls potentials of full-height walls at the outer ends, null where a strip runs on
 * @param fineness multiplies the number of modes
 */
export function solveChain(
  cell: Cell,
  strips: readonly Strip[],
  walls: readonly [Wall, Wall],
  fineness: number,
): CrossSection {
  const fields = strips.map(({ kind }) => fieldOf(cell, kind, fineness));
  const narrowLeft = fields
    .slice(1)
    .map((right, i) => fields[i]!.z1 - fields[i]!.z0 <= right.z1 - right.z0);
  const counts = narrowLeft.map((left, i) => fields[left ? i : i + 1]!.kappa.length);
  const from = counts.map((_, i) => counts.slice(0, i).reduce((a, b) => a + b, 0));
  const size = counts.reduce((a, b) => a + b, 0);
  const quadratic = new Quadratic(size);

  /** Coefficient of mode k of strip s at interface i. */
  const coefficients = (s: number, i: number): Affine[] => {
    const own = fields[s]!;
    const isNarrow = narrowLeft[i] ? s === i : s === i + 1;
    const count = counts[i]!;
    if (isNarrow) {
      return own.kappa.map((_, k) => {
        const row = new Float64Array(count);
        row[k] = 1;
        return { from: from[i]!, row, constant: 0 };
      });
    }
    const narrow = fields[narrowLeft[i] ? i : i + 1]!;
    const { matrix, face } = project(own, narrow);
    return own.kappa.map((_, k) => ({
      from: from[i]!,
      row: matrix.subarray(k * count, (k + 1) * count),
      constant: face[k]!,
    }));
  };

  const atWall = (s: number, wall: Wall): Affine[] | null => {
    if (wall === null) return null;
    const own = fields[s]!;
    return own.kappa.map((kappa, k) => ({
      from: 0,
      row: new Float64Array(0),
      constant:
        own.scale[k]! *
        ((wall - own.base + own.slope * own.z0) *
          integral(kappa, own.phase[k]!, own.z0, own.z1) -
          own.slope * firstMoment(kappa, own.phase[k]!, own.z0, own.z1)),
    }));
  };

  const last = strips.length - 1;
  strips.forEach((strip, s) => {
    const left = s === 0 ? atWall(s, walls[0]) : coefficients(s, s - 1);
    const right = s === last ? atWall(s, walls[1]) : coefficients(s, s);
    fields[s]!.kappa.forEach((kappa, k) => {
      const runsOn = left === null || right === null;
      const { own, cross } = ends(kappa, runsOn ? Infinity : strip.length);
      if (left) quadratic.add(own, left[k]!, left[k]!);
      if (right) quadratic.add(own, right[k]!, right[k]!);
      if (left && right) quadratic.add(-2 * cross, left[k]!, right[k]!);
    });
  });

  const unknowns = solve(quadratic.matrix, quadratic.right);
  let energy = quadratic.constant;
  unknowns.forEach((value, i) => (energy -= quadratic.right[i]! * value));

  return { excess: energy };
}

/**
 * {@link solveChain} at two finenesses, extrapolated: the error goes with the square of the
 * number of modes.
 * @returns capacitance per unit length of edge over ε, without the area term
 */
export function edgeGain(
  cell: Cell,
  strips: readonly Strip[],
  walls: readonly [Wall, Wall] = [null, null],
): number {
  const coarse = solveChain(cell, strips, walls, 1).excess;
  const fine = solveChain(cell, strips, walls, 2).excess;
  return fine + (fine - coarse) / 3;
}
