import { cellCount, gradedLine, gradedSpan, type Grading, type Stop } from './grading';
import { gridPlan } from './grid-plan';
import { part, planMesh, type PlanMesh } from './plan-mesh';
import { outerRadius, rotorRadius, statorRadius, type StackShape } from './stack-shape';

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

const turn = 2 * Math.PI;
const sameAngle = 1e-9;

function inTurn(angle: number): number {
  const a = angle - turn * Math.floor(angle / turn);
  return turn - a < sameAngle ? 0 : a;
}

/** Whether `angle` lies in the sector from `from` over `width`, its ends included. */
function inSector(angle: number, from: number, width: number): boolean {
  const a = inTurn(angle - from);
  return a <= width + sameAngle;
}

/** Radius of the rotor's blade at ψ, carried on smoothly through the sector without blade. */
function bladeRadius(shape: StackShape, theta: number, psi: number): number {
  const phi = inTurn(theta - psi);
  if (phi <= shape.travel + sameAngle) {
    return rotorRadius(shape, Math.min(phi, shape.travel));
  }
  const s = (phi - shape.travel) / (turn - shape.travel);
  const blend = s * s * (3 - 2 * s);
  const tail = rotorRadius(shape, shape.travel);
  return tail + (rotorRadius(shape, 0) - tail) * blend;
}

/**
 * The plan of a stack at mesh angle θ on a polar grid whose rows are radial edges and whose
 * columns follow the arcs and the rotor's outline. Only for stators bounded by radii and arcs.
 */
export function polarPlan(shape: StackShape, theta: number, fine: Fineness): PlanMesh {
  if (shape.stator.form !== 'arc' || shape.edgeOffset !== 0) {
    throw new Error('a polar grid carries stators of radii and arcs alone');
  }
  const { travel, shaftRadius, hubRadius, cutoutRadius, gap } = shape;
  const step = fine.step * gap;
  const grading: Grading = {
    growth: fine.growth,
    most: Infinity,
    refinement: fine.refinement,
  };
  const edges = [0, travel, inTurn(theta), inTurn(theta - travel)].sort((a, b) => a - b);
  const angleStep = step / outerRadius(shape);
  const stops: Stop[] = [...edges, turn]
    .filter((at, i, all) => i === 0 || at - all[i - 1]! > sameAngle)
    .map((at) => ({ at, step: angleStep }));
  const rows = gradedLine(stops, { ...grading, most: fine.mostAngle });
  rows.pop();

  const blades = rows.map((psi) => bladeRadius(shape, theta, psi));
  const lines = (row: number): Stop[] => [
    { at: shaftRadius, step: Infinity },
    { at: hubRadius, step },
    { at: cutoutRadius, step },
    { at: blades[row]!, step },
    { at: statorRadius(shape, 0), step },
    { at: outerRadius(shape) * fine.box, step: Infinity },
  ];
  // As many columns between two lines as the row needs that needs most.
  const counts = [0, 0, 0, 0, 0];
  rows.forEach((_, row) => {
    const at = lines(row);
    counts.forEach((most, i) => {
      counts[i] = Math.max(most, cellCount(at[i]!, at[i + 1]!, grading));
    });
  });
  const places = rows.map((_, row) => {
    const at = lines(row);
    return [
      shaftRadius,
      ...counts.flatMap((n, i) => gradedSpan(at[i]!, at[i + 1]!, n, grading)),
    ];
  });
  const lineColumn = counts.map((_, i) => counts.slice(0, i + 1).reduce((a, b) => a + b, 0));
  const [hub, cutout, blade, rim] = lineColumn as [number, number, number, number];

  return planMesh(
    gridPlan({
      metric: 'polar',
      rows,
      closed: true,
      columns: places[0]!.length,
      place: (column, row) => places[row]![column]!,
      mask: (column, row) => {
        const onBlade = column <= blade && inSector(theta - rows[row]!, 0, travel);
        const onStator = column >= cutout && column <= rim && inSector(rows[row]!, 0, travel);
        return (
          (column === 0 ? part.shaft : 0) |
          (column <= hub || onBlade ? part.rotor : 0) |
          (onStator ? part.stator : 0)
        );
      },
    }),
  );
}
