import { sameAngle, turn } from './angle';
import { cellCount, gradedSpan, type Grading, type Stop } from './grading';
import { gridPlan } from './grid-plan';
import { part, planMesh, type PlanMesh } from './plan-mesh';
import { outlines, radialEdges } from './stack-lines';
import { outerRadius, type StackShape } from './stack-shape';

/** How fine a grid is: everything a solution's error depends on. */
export interface Fineness {
  /** Step at an edge over the gap, refinement 1. */
  step: number;
  /** Step per distance from an edge, refinement 1. */
  growth: number;
  /** Longest step in angle, rad, refinement 1. */
  mostAngle: number;
  refinement: number;
  /** Radius of the box over the plates' largest radius. */
  box: number;
}

/** Lines that cross are kept this part of an edge step apart. */
const apart = 0.25;

/** A grid across lines that may cross: the same cells between them wherever it is cut. */
interface Ruling {
  /** Rank of each given line among the sorted lines, by cut. */
  points: number[][];
  /** Index of the grid point on the line, by line and cut. */
  indexOf: (line: number, cut: number) => number;
}

/** Rules a grid over lines given at several cuts; `closing` adds the first line one turn on. */
function rule(cuts: Stop[][], grading: Grading, closing: number | null): Ruling {
  const sorted = cuts.map((lines) =>
    lines
      .map((stop, line) => ({ ...stop, line }))
      .sort((a, b) => a.at - b.at || a.line - b.line),
  );
  const ends = sorted.map((stops) =>
    closing === null ? stops : [...stops, { ...stops[0]!, at: stops[0]!.at + closing }],
  );
  const counts = ends[0]!.slice(1).map(() => 0);
  for (const stops of ends) {
    counts.forEach((most, i) => {
      counts[i] = Math.max(most, cellCount(stops[i]!, stops[i + 1]!, grading));
    });
  }
  const offsets = [0];
  for (const n of counts) offsets.push(offsets.at(-1)! + n);
  const points = ends.map((stops) => {
    const line = [stops[0]!.at];
    counts.forEach((n, i) => line.push(...gradedSpan(stops[i]!, stops[i + 1]!, n, grading)));
    if (closing !== null) line.pop();
    return line;
  });
  return {
    points,
    indexOf: (line, cut) => offsets[sorted[cut]!.findIndex((stop) => stop.line === line)]!,
  };
}

/** Angles kept apart where their lines cross, in place. */
function keepApart(stops: Stop[], least: number): void {
  const order = [...stops].sort((a, b) => a.at - b.at);
  for (let i = 1; i < order.length; i += 1) {
    const gap = order[i]!.at - order[i - 1]!.at;
    if (gap >= least) continue;
    order[i - 1]!.at -= (least - gap) / 2;
    order[i]!.at += (least - gap) / 2;
  }
}

/**
 * The plan of a stack at mesh angle θ on a polar grid: rows follow the radial edges, columns the
 * arcs and outlines. Either rows or columns may bend, not both.
 */
export function polarPlan(shape: StackShape, theta: number, fine: Fineness): PlanMesh {
  const { travel, shaftRadius, hubRadius, cutoutRadius, gap, edgeOffset } = shape;
  const outer = outerRadius(shape);
  const bentColumns = shape.rotor.form !== 'arc' || shape.stator.form !== 'arc';
  if (bentColumns && edgeOffset !== 0) {
    throw new Error('a polar grid bends its rows or its columns, not both');
  }
  const step = fine.step * gap;
  const least = apart * step;
  const grading: Grading = {
    growth: fine.growth,
    most: Infinity,
    refinement: fine.refinement,
  };

  const edges = radialEdges(shape, theta);
  // Edges on one line all the way are one line of the grid.
  const lineOf: number[] = [];
  const curves: ((rho: number) => number)[] = [];
  for (const curve of [
    edges.statorFirst,
    edges.statorLast,
    () => edges.rotorLeading,
    () => edges.rotorTrailing,
  ]) {
    const same = curves.findIndex((other) =>
      [cutoutRadius, outer].every((rho) => Math.abs(curve(rho) - other(rho)) < sameAngle),
    );
    lineOf.push(same === -1 ? curves.length : same);
    if (same === -1) curves.push(curve);
  }
  const anglesAt = (rho: number): Stop[] => {
    const stops = curves.map((curve) => ({ at: curve(rho), step: step / outer }));
    if (edgeOffset !== 0) keepApart(stops, least / outer);
    return stops;
  };
  const radiiAt = (psi: number): Stop[] => {
    const { blade, rim } = outlines(shape, theta, psi, least);
    return [
      { at: shaftRadius, step: Infinity },
      { at: hubRadius, step },
      { at: cutoutRadius, step },
      { at: blade, step },
      { at: rim, step },
      { at: outer * fine.box, step: Infinity },
    ];
  };

  // The family that may bend is ruled over the cuts that the straight one makes.
  const angular = { ...grading, most: fine.mostAngle };
  let rows: Ruling;
  let columns: Ruling;
  if (edgeOffset === 0) {
    rows = rule([anglesAt(outer)], angular, turn);
    columns = rule(rows.points[0]!.map(radiiAt), grading, null);
  } else {
    columns = rule([radiiAt(0)], grading, null);
    rows = rule(columns.points[0]!.map(anglesAt), angular, turn);
  }
  const rowCut = (column: number) => (edgeOffset === 0 ? 0 : column);
  const columnCut = (row: number) => (edgeOffset === 0 ? row : 0);
  const count = rows.points[0]!.length;
  const between = (row: number, from: number, to: number) =>
    (row - from + count) % count <= (to - from + count) % count;

  return planMesh(
    gridPlan({
      metric: 'polar',
      rows: count,
      columns: columns.points[0]!.length,
      closed: true,
      first: (column, row) => columns.points[columnCut(row)]![column]!,
      second: (column, row) => rows.points[rowCut(column)]![row]!,
      mask: (column, row) => {
        const edge = (i: number) => rows.indexOf(lineOf[i]!, rowCut(column));
        const arc = (i: number) => columns.indexOf(i, columnCut(row));
        const onBlade = column <= arc(3) && between(row, edge(3), edge(2));
        const onStator = column >= arc(2) && column <= arc(4) && between(row, edge(0), edge(1));
        return (
          (column === 0 ? part.shaft : 0) |
          (column <= arc(1) || onBlade ? part.rotor : 0) |
          (onStator ? part.stator : 0)
        );
      },
    }),
  );
}
