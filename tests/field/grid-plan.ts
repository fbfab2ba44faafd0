import { turn } from './angle';
import type { Metric, Triangulation } from './plan-mesh';

/** A grid of rows and columns whose points may lie anywhere. */
export interface Grid {
  metric: Metric;
  rows: number;
  columns: number;
  /** Whether the last row's neighbour is the first. */
  closed: boolean;
  /** Radius or x of a point, mm. */
  first: (column: number, row: number) => number;
  /** Angle, rad, or y, mm, of a point. */
  second: (column: number, row: number) => number;
  /** Parts whose plan the point lies in. */
  mask: (column: number, row: number) => number;
}

/** Cuts each cell of a grid along the diagonal that conducts, the Delaunay one. */
export function gridPlan(grid: Grid): Triangulation {
  const { rows, columns, metric } = grid;
  const count = rows * columns;
  const first = new Float64Array(count);
  const second = new Float64Array(count);
  const mask = new Uint8Array(count);
  for (let row = 0; row < rows; row += 1) {
    for (let column = 0; column < columns; column += 1) {
      const p = row * columns + column;
      first[p] = grid.first(column, row);
      second[p] = grid.second(column, row);
      mask[p] = grid.mask(column, row);
    }
  }

  const polar = metric === 'polar';
  const cotangent = (at: number, p: number, q: number, radius: number) => {
    const x1 = first[p]! - first[at]!;
    const x2 = first[q]! - first[at]!;
    let y1 = second[p]! - second[at]!;
    let y2 = second[q]! - second[at]!;
    if (polar) {
      y1 = radius * (y1 - turn * Math.round(y1 / turn));
      y2 = radius * (y2 - turn * Math.round(y2 / turn));
    }
    return (x1 * x2 + y1 * y2) / Math.abs(x1 * y2 - x2 * y1);
  };

  const bands = grid.closed ? rows : rows - 1;
  const corners = new Int32Array(bands * (columns - 1) * 6);
  let at = 0;
  for (let row = 0; row < bands; row += 1) {
    const next = (row + 1) % rows;
    for (let column = 0; column + 1 < columns; column += 1) {
      const a = row * columns + column;
      const d = next * columns + column;
      const [b, c] = [a + 1, d + 1];
      const radius = (first[a]! + first[b]! + first[c]! + first[d]!) / 4;
      const rising = cotangent(b, a, c, radius) + cotangent(d, a, c, radius) >= -1e-9;
      corners.set(rising ? [a, b, c, a, c, d] : [a, b, d, b, c, d], at);
      at += 6;
    }
  }
  return { metric, first, second, mask, corners };
}
