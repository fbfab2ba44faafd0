/** Radii of the rings scribed on the floor, mm: four to ten of them, at 1, 2 or 5 times a power of ten. */
export interface PolarGrid {
  readonly step: number;
  readonly rings: readonly number[];
  /** Outermost ring, mm. */
  readonly radius: number;
}

/** @param reach what the outermost ring must hold, mm. */
export function polarGrid(reach: number): PolarGrid {
  if (!(reach > 0) || !Number.isFinite(reach)) {
    throw new RangeError(`invalid reach of the floor: ${reach} mm`);
  }
  const power = 10 ** Math.floor(Math.log10(reach / 4));
  const step = [5, 2, 1].map((n) => n * power).find((s) => s <= reach / 4) ?? power;
  const count = Math.ceil(reach / step - 1e-9);
  return {
    step,
    rings: Array.from({ length: count }, (_, i) => Number(((i + 1) * step).toPrecision(6))),
    radius: Number((count * step).toPrecision(6)),
  };
}

/** A limit further out than this many times the plates would leave the plates too small to read. */
const LIMIT_IN_VIEW = 1.4;

/** The rings for plates of this reach, and whether the largest radius allowed is in view. */
export function floorGrid(
  outerRadius: number,
  largestRadius: number,
): PolarGrid & { readonly limitShown: boolean } {
  const limitShown = largestRadius <= LIMIT_IN_VIEW * outerRadius;
  return { ...polarGrid(Math.max(outerRadius, limitShown ? largestRadius : 0)), limitShown };
}
