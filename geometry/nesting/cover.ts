/** A shape as the cells of a grid that it touches, column by column. */

import { EndType, inflatePaths, JoinType } from 'clipper2-ts';
import { flatten } from '../flatten';
import type { Contour, Point } from '../outline';
import { CLIP_UNIT } from '../tolerances';

/** mm. Sagitta of the chords; the shape is grown by as much again, so that it is never too small. */
const CHORDS = 0.02;

/**
 * A contour grown on all sides, as a polygon that holds it.
 * @param by mm
 */
export function grownPolygon(contour: Contour, by: number): Point[] {
  const flat = flatten(contour, CHORDS);
  const points = [];
  for (let i = 0; i < flat.length; i += 2) {
    const x = Math.round(flat[i]! / CLIP_UNIT);
    const y = Math.round(flat[i + 1]! / CLIP_UNIT);
    points.push({ x, y, z: 0 });
  }
  const unit = 1 / CLIP_UNIT;
  const delta = (by + 2 * CHORDS) * unit;
  const grown = inflatePaths(
    [points],
    delta,
    JoinType.Round,
    EndType.Polygon,
    2,
    CHORDS * unit,
  );
  const size = (ring: readonly Point[]): number =>
    ring.reduce((sum, a, i) => {
      const b = ring[(i + 1) % ring.length]!;
      return sum + a.x * b.y - b.x * a.y;
    }, 0);
  // Holes that the growing closes stay closed: nothing is put into another part's slot mouth.
  const outer = grown.reduce((a, b) => (size(b) > size(a) ? b : a));
  return outer.map(({ x, y }) => ({ x: x * CLIP_UNIT, y: y * CLIP_UNIT }));
}

export interface Cover {
  /** Cells. */
  readonly width: number;
  readonly height: number;
  /** From the part's own origin to the cover's first corner, mm. */
  readonly minX: number;
  readonly minY: number;
  /** For each column its stretches of cells: first, last, first, last, … */
  readonly columns: readonly Int32Array[];
  /** Mean of its cells along x: where its weight lies. */
  readonly middle: number;
}

/** Stretches of set cells in one column. */
function stretchesOf(cells: Uint8Array): Int32Array {
  const ends: number[] = [];
  for (let i = 0; i < cells.length; i++) {
    if (cells[i] && !cells[i - 1]) ends.push(i);
    if (cells[i] && !cells[i + 1]) ends.push(i);
  }
  return Int32Array.from(ends);
}

/** All cells that a polygon touches when turned by an angle. */
export function coverOf(polygon: readonly Point[], angle: number, cell: number): Cover {
  const cos = Math.cos(angle);
  const sin = Math.sin(angle);
  const xs = polygon.map(({ x, y }) => x * cos - y * sin);
  const ys = polygon.map(({ x, y }) => x * sin + y * cos);
  const minX = Math.min(...xs);
  const minY = Math.min(...ys);
  const width = Math.max(1, Math.ceil((Math.max(...xs) - minX) / cell - 1e-9));
  const height = Math.max(1, Math.ceil((Math.max(...ys) - minY) / cell - 1e-9));
  const cells = Array.from({ length: width }, () => new Uint8Array(height));
  const crossings: number[][] = cells.map(() => []);
  const row = (y: number): number => Math.min(height - 1, Math.max(0, Math.floor(y)));
  for (let i = 0; i < xs.length; i++) {
    const j = (i + 1) % xs.length;
    let [ax, ay] = [(xs[i]! - minX) / cell, (ys[i]! - minY) / cell];
    let [bx, by] = [(xs[j]! - minX) / cell, (ys[j]! - minY) / cell];
    if (ax > bx) [ax, ay, bx, by] = [bx, by, ax, ay];
    const yAt = (x: number): number =>
      bx === ax ? ay : ay + ((by - ay) * (x - ax)) / (bx - ax);
    const last = Math.min(width - 1, Math.floor(bx));
    for (let column = Math.floor(ax); column <= last; column++) {
      // The stretch of this edge that lies in the column.
      const from = yAt(Math.max(ax, column));
      const to = bx === ax ? by : yAt(Math.min(bx, column + 1));
      cells[column]!.fill(1, row(Math.min(from, to)), row(Math.max(from, to)) + 1);
      const centre = column + 0.5;
      if (ax <= centre && centre < bx) crossings[column]!.push(yAt(centre));
    }
  }
  let sum = 0;
  let count = 0;
  const columns = cells.map((column, x) => {
    const at = crossings[x]!.sort((a, b) => a - b);
    for (let k = 0; k + 1 < at.length; k += 2) column.fill(1, row(at[k]!), row(at[k + 1]!) + 1);
    const set = column.reduce((total, value) => total + value, 0);
    sum += set * (x + 0.5);
    count += set;
    return stretchesOf(column);
  });
  return { width, height, minX, minY, columns, middle: sum / count };
}
