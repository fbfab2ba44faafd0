import type { Metric, Triangulation } from './plan-mesh';

/** A grid of rows (second coordinate) whose points may lie anywhere along each row. */
export interface Grid {
  metric: Metric;
  /** The rows' second coordinate, rising: angle in rad or y in mm. */
  rows: number[];
  /** Whether the last row's neighbour is the first. */
  closed: boolean;
  /** Number of points in every row. */
  columns: number;
  /** First coordinate of a point. */
  place: (column: number, row: number) => number;
  /** Parts whose plan the point lies in. */
  mask: (column: number, row: number) => number;
}

/** Cuts each cell of a grid along the diagonal that leaves the larger angles whole. */
export function gridPlan(grid: Grid): Triangulation {
  const { rows, columns, metric } = grid;
  const count = rows.length * columns;
  const first = new Float64Array(count);
  const second = new Float64Array(count);
  const mask = new Uint8Array(count);
  for (let row = 0; row < rows.length; row += 1) {
    for (let column = 0; column < columns; column += 1) {
      const p = row * columns + column;
      first[p] = grid.place(column, row);
      second[p] = rows[row]!;
      mask[p] = grid.mask(column, row);
    }
  }
  const bands = grid.closed ? rows.length : rows.length - 1;
  const corners = new Int32Array(bands * (columns - 1) * 6);
  let at = 0;
  for (let row = 0; row < bands; row += 1) {
    const next = (row + 1) % rows.length;
    for (let column = 0; column + 1 < columns; column += 1) {
      const a = row * columns + column;
      const d = next * columns + column;
      // Rows are straight and parallel, so the shorter diagonal is the Delaunay one.
      const rising = Math.abs(first[d + 1]! - first[a]!);
      const falling = Math.abs(first[d]! - first[a + 1]!);
      corners.set(
        rising <= falling ? [a, a + 1, d + 1, a, d + 1, d] : [a, a + 1, d, a + 1, d + 1, d],
        at,
      );
      at += 6;
    }
  }
  return { metric, first, second, mask, corners };
}
