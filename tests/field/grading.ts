/**
 * One-dimensional grids that are fine at edges and grow away from them.
 *
 * The wanted step at distance d from an edge is `step + growth·d`, never above `most`. A whole
 * grid is refined by a whole number, so that grids of one family are cut alike and their
 * results can be extrapolated.
 */
export interface Stop {
  /** Where the line has a grid point whatever happens. */
  at: number;
  /** The wanted step there; Infinity where nothing happens. */
  step: number;
}

export interface Grading {
  /** Step per distance from an edge at refinement 1. */
  growth: number;
  /** The longest step at refinement 1. */
  most: number;
  /** Number of cells a cell of refinement 1 is cut into. */
  refinement: number;
}

interface Span {
  left: number;
  right: number;
  width: number;
}

/** Where the growth from the left meets the growth from the right. */
function crossing({ left, right, width }: Span, growth: number): number {
  if (left === Infinity && right === Infinity) return width / 2;
  if (left === Infinity) return 0;
  if (right === Infinity) return width;
  return Math.min(width, Math.max(0, width / 2 + (right - left) / (2 * growth)));
}

/** Cells between an edge and distance d from it. */
function cellsWithin(step: number, d: number, { growth, most }: Grading): number {
  if (step === Infinity || step >= most) return d / most;
  const free = Math.min(d, (most - step) / growth);
  return Math.log1p((growth * free) / step) / growth + (d - free) / most;
}

/** The inverse of cellsWithin. */
function distanceWithin(step: number, cells: number, { growth, most }: Grading): number {
  if (step === Infinity || step >= most) return cells * most;
  const free = (most - step) / growth;
  const freeCells = Math.log1p((growth * free) / step) / growth;
  return cells <= freeCells
    ? (Math.expm1(growth * cells) * step) / growth
    : free + (cells - freeCells) * most;
}

function cellsOf(span: Span, grading: Grading): number {
  const mid = crossing(span, grading.growth);
  return (
    cellsWithin(span.left, mid, grading) + cellsWithin(span.right, span.width - mid, grading)
  );
}

/** Whole number of cells for a span, a multiple of the refinement. */
export function cellCount(from: Stop, to: Stop, grading: Grading): number {
  const span = { left: from.step, right: to.step, width: to.at - from.at };
  return grading.refinement * Math.max(1, Math.ceil(cellsOf(span, grading) - 1e-6));
}

/** `count` cells between two stops: the grid points after `from`, up to and including `to`. */
export function gradedSpan(from: Stop, to: Stop, count: number, grading: Grading): number[] {
  const span = { left: from.step, right: to.step, width: to.at - from.at };
  const mid = crossing(span, grading.growth);
  const leftCells = cellsWithin(span.left, mid, grading);
  const total = cellsOf(span, grading);
  const points: number[] = [];
  for (let i = 1; i < count; i += 1) {
    const cells = (total * i) / count;
    points.push(
      cells <= leftCells
        ? from.at + distanceWithin(span.left, cells, grading)
        : to.at - distanceWithin(span.right, total - cells, grading),
    );
  }
  points.push(to.at);
  return points;
}

/** A whole line through stops in rising order. */
export function gradedLine(stops: Stop[], grading: Grading): number[] {
  const line = [stops[0]!.at];
  for (let i = 1; i < stops.length; i += 1) {
    const from = stops[i - 1]!;
    const to = stops[i]!;
    line.push(...gradedSpan(from, to, cellCount(from, to, grading), grading));
  }
  return line;
}
