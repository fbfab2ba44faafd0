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

/** Wave numbers this near are taken as one: their difference is no divisor. */
const SAME_WAVE = 1e-7;

/** ∫ cos(az + p) dz from z0 to z1. */
function integral(a: number, p: number, z0: number, z1: number): number {
  if (Math.abs(a) < SAME_WAVE) return Math.cos((a * (z0 + z1)) / 2 + p) * (z1 - z0);
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

/** Sine and cosine of each mode's argument at a height. */
function argumentsAt({ kappa, phase }: Field, z: number): [Float64Array, Float64Array] {
  const sine = new Float64Array(kappa.length);
  const cosine = new Float64Array(kappa.length);
  for (let k = 0; k < kappa.length; k++) {
    const argument = kappa[k]! * z + phase[k]!;
    sine[k] = Math.sin(argument);
    cosine[k] = Math.cos(argument);
  }
  return [sine, cosine];
}

function project(wide: Field, narrow: Field): Projection {
  const rows = wide.kappa.length;
  const columns = narrow.kappa.length;
  const matrix = new Float64Array(rows * columns);
  const face = new Float64Array(rows);
  const { z0, z1 } = narrow;
  const [ws0, wc0] = argumentsAt(wide, z0);
  const [ws1, wc1] = argumentsAt(wide, z1);
  const [ns0, nc0] = argumentsAt(narrow, z0);
  const [ns1, nc1] = argumentsAt(narrow, z1);
  for (let k = 0; k < rows; k++) {
    const [a, p, sa] = [wide.kappa[k]!, wide.phase[k]!, wide.scale[k]!];
    for (let j = 0; j < columns; j++) {
      const b = narrow.kappa[j]!;
      // ∫ cos A·cos B by sines of A ± B at both ends.
      const crossed1 = wc1[k]! * ns1[j]!;
      const crossed0 = wc0[k]! * ns0[j]!;
      const straight1 = ws1[k]! * nc1[j]!;
      const straight0 = ws0[k]! * nc0[j]!;
      const sum = a + b;
      const difference = a - b;
      const together =
        sum < SAME_WAVE
          ? integral(sum, p + narrow.phase[j]!, z0, z1)
          : (straight1 + crossed1 - straight0 - crossed0) / sum;
      const apart =
        Math.abs(difference) < SAME_WAVE
          ? integral(difference, p - narrow.phase[j]!, z0, z1)
          : (straight1 - crossed1 - straight0 + crossed0) / difference;
      matrix[k * columns + j] = (sa * narrow.scale[j]! * (together + apart)) / 2;
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

/** A quadratic form in the unknowns: uᵀ·matrix·u − 2·rightᵀ·u + constant. */
class Quadratic {
  constructor(
    readonly size: number,
    readonly matrix = new Float64Array(size * size),
    readonly right = new Float64Array(size),
    public constant = 0,
  ) {}

  copy(): Quadratic {
    return new Quadratic(this.size, this.matrix.slice(), this.right.slice(), this.constant);
  }

  /** weight · f², f(u) = Σ row[j]·u[from + j] + constant. */
  addSquare(weight: number, { from, row, constant }: Affine): void {
    this.constant += weight * constant * constant;
    for (let i = 0; i < row.length; i++) {
      const scaled = weight * row[i]!;
      if (scaled === 0) continue;
      this.right[from + i]! -= scaled * constant;
      const at = (from + i) * this.size + from;
      for (let j = 0; j <= i; j++) this.matrix[at + j]! += scaled * row[j]!;
    }
  }

  /** 2·weight · f·g of forms in different unknowns, those of f before those of g. */
  addProduct(weight: number, f: Affine, g: Affine): void {
    this.constant += 2 * weight * f.constant * g.constant;
    for (let i = 0; i < f.row.length; i++)
      this.right[f.from + i]! -= weight * f.row[i]! * g.constant;
    for (let j = 0; j < g.row.length; j++) {
      const scaled = weight * g.row[j]!;
      if (scaled === 0) continue;
      this.right[g.from + j]! -= scaled * f.constant;
      const at = (g.from + j) * this.size + f.from;
      for (let i = 0; i < f.row.length; i++) this.matrix[at + i]! += scaled * f.row[i]!;
    }
  }

  /** Its least value, by Cholesky's method on the lower half. The form is used up. */
  least(): number {
    const { matrix: m, right: x, size: n } = this;
    for (let i = 0; i < n; i++) {
      const row = i * n;
      for (let j = 0; j <= i; j++) {
        const other = j * n;
        let sum = m[row + j]!;
        for (let k = 0; k < j; k++) sum -= m[row + k]! * m[other + k]!;
        m[row + j] = i === j ? Math.sqrt(Math.max(sum, Number.MIN_VALUE)) : sum / m[other + j]!;
      }
    }
    // With L·y = right the least value is constant − y·y.
    let least = this.constant;
    for (let i = 0; i < n; i++) {
      const row = i * n;
      let sum = x[i]!;
      for (let k = 0; k < i; k++) sum -= m[row + k]! * x[k]!;
      x[i] = sum / m[row + i]!;
      least -= x[i]! * x[i]!;
    }
    return least;
  }
}

interface Affine {
  readonly from: number;
  readonly row: Float64Array;
  readonly constant: number;
}

/**
 * A chain of strips at a number of modes, made once and then solved for any lengths.
 * @param kinds from left to right; neighbours differ
 * @param walls potentials of full-height walls at the outer ends, null where a strip runs on
 * @param fineness multiplies the number of modes
 * @returns capacitance per unit length of edge over ε, without the area term of overlap strips,
 *   for the lengths of the strips
 */
export function prepareChain(
  cell: Cell,
  kinds: readonly StripKind[],
  walls: readonly [Wall, Wall],
  fineness: number,
): (lengths: readonly number[]) => number {
  const fields = kinds.map((kind) => fieldOf(cell, kind, fineness));
  const narrowLeft = fields
    .slice(1)
    .map((right, i) => fields[i]!.z1 - fields[i]!.z0 <= right.z1 - right.z0);
  const counts = narrowLeft.map((left, i) => fields[left ? i : i + 1]!.kappa.length);
  const from = counts.map((_, i) => counts.slice(0, i).reduce((a, b) => a + b, 0));

  /** Coefficients of the modes of strip s at interface i. */
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
    const { matrix, face } = project(own, fields[narrowLeft[i] ? i : i + 1]!);
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

  const last = kinds.length - 1;
  const sides = fields.map((_, s) => ({
    left: s === 0 ? atWall(s, walls[0]) : coefficients(s, s - 1),
    right: s === last ? atWall(s, walls[1]) : coefficients(s, s),
  }));
  // Strips that run on have no length to change.
  const always = new Quadratic(counts.reduce((a, b) => a + b, 0));
  sides.forEach(({ left, right }, s) => {
    const only = left === null ? right : right === null ? left : null;
    only?.forEach((form, k) => always.addSquare(fields[s]!.kappa[k]!, form));
  });

  return (lengths) => {
    const quadratic = always.copy();
    sides.forEach(({ left, right }, s) => {
      if (!left || !right) return;
      fields[s]!.kappa.forEach((kappa, k) => {
        const { own, cross } = ends(kappa, lengths[s]!);
        quadratic.addSquare(own, left[k]!);
        quadratic.addSquare(own, right[k]!);
        quadratic.addProduct(-cross, left[k]!, right[k]!);
      });
    });
    return quadratic.least();
  };
}

/**
 * {@link prepareChain} at two finenesses, extrapolated: the error goes with the square of the
 * number of modes.
 */
export function edgeGain(
  cell: Cell,
  kinds: readonly StripKind[],
  walls: readonly [Wall, Wall] = [null, null],
): (lengths: readonly number[]) => number {
  const coarse = prepareChain(cell, kinds, walls, 1);
  const fine = prepareChain(cell, kinds, walls, 2);
  return (lengths) => {
    const at = fine(lengths);
    return at + (at - coarse(lengths)) / 3;
  };
}
