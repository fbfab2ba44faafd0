/** How finely three grids of one family are cut, rising. */
export type Refinements = readonly [number, number, number];

/** Results on three grids of one family, and where they lead. */
export interface Limit {
  value: number;
  /** Half-width of the interval the exact value is held to lie in. */
  uncertainty: number;
  /** Fitted order p of the error, a·n^−p at refinement n. */
  order: number;
}

// Between the order of a 270° metal edge on an even grid (4/3, energy) and smooth fields (2).
const orders = { least: 4 / 3, most: 2 };
/** Part of the last correction held to be doubtful; README.md shows what it is on exact cases. */
const doubtful = 0.15;

/** Richardson extrapolation with the order fitted. */
export function extrapolate(
  refinements: Refinements,
  values: readonly [number, number, number],
): Limit {
  const [n1, n2, n3] = refinements;
  const [c1, c2, c3] = values;
  const wanted = (c1 - c2) / (c2 - c3);
  const ratio = (p: number) => (n1 ** -p - n2 ** -p) / (n2 ** -p - n3 ** -p);
  // The ratio rises with p.
  let { least, most } = orders;
  for (let i = 0; i < 60; i += 1) {
    const p = (least + most) / 2;
    if (ratio(p) < wanted) least = p;
    else most = p;
  }
  const order = (least + most) / 2;
  const correction = ((c2 - c3) * n3 ** -order) / (n2 ** -order - n3 ** -order);
  return { value: c3 - correction, uncertainty: doubtful * Math.abs(correction), order };
}
