/**
 * What the plan view adds to the capacitance over the whole turn: the open space between the
 * plates of each gap, without the open wedges that facing radial edges would have by themselves,
 * and the end faces of the stack. Both change slowly with the angle, so that a few solutions
 * carry them.
 */

import type { EdgeTable } from './edge-table';
import { endEdgeRadius, endFaceCapacitance } from './end-face';
import type { HubEdges } from './hub-edges';
import { planField } from './plan-view';
import { piecesBeside, planWalls, sidesOf, type Polygon, type Standing } from './plan-walls';
import { turned, wallRule, type EndPlate, type PlanShape, type Potentials } from './plan-shape';
import { openWedges } from './radial-edges';

/** What the plan view adds at a mesh angle, over ε. */
export interface PlanShare {
  /** Per gap and unit height. */
  readonly openSpace: (meshAngle: number) => number;
  /** All end faces of the stack together, mm. */
  readonly endFaces: (meshAngle: number) => number;
}

/** Solutions over the turn; of Chebyshev points every second one is one of half as many. */
const NODES = 11;

/** A solution is kept this many gaps of rim away from angles at which edges lie on one another. */
const CLEAR_OF_FLUSH = 0.4;

/** Chebyshev points of the second kind on an interval, kept away from the flush angles. */
function nodesBetween(
  from: number,
  to: number,
  flush: readonly number[],
  clear: number,
): number[] {
  return Array.from({ length: NODES }, (_, i) => {
    let node = (from + to) / 2 - ((to - from) / 2) * Math.cos((Math.PI * i) / (NODES - 1));
    for (const angle of flush) {
      if (Math.abs(node - angle) >= clear) continue;
      const inwards =
        angle - clear < from ? 1 : angle + clear > to ? -1 : Math.sign(node - angle) || 1;
      node = angle + inwards * clear;
    }
    return node;
  });
}

/** Area inside a polygon, mm². */
function areaOf(polygon: Polygon): number {
  let sum = 0;
  const n = polygon.length;
  for (let i = 0; i < n; i += 2) {
    sum += polygon[i]! * polygon[(i + 3) % n]! - polygon[(i + 2) % n]! * polygon[i + 1]!;
  }
  return sum / 2;
}

/** Values between the nodes, by the polynomial through them (barycentric form). */
function through(nodes: readonly number[], values: readonly number[]): (at: number) => number {
  const count = nodes.length;
  const span = (nodes[count - 1]! - nodes[0]!) / 4;
  // Barycentric weights of the nodes as they came to lie.
  const weights = nodes.map((node, i) =>
    nodes.reduce((w, other, j) => (j === i ? w : (w * span) / (node - other)), 1),
  );
  return (at) => {
    let above = 0;
    let below = 0;
    for (let i = 0; i < count; i++) {
      const apart = at - nodes[i]!;
      if (Math.abs(apart) < 1e-12) return values[i]!;
      above += (weights[i]! / apart) * values[i]!;
      below += weights[i]! / apart;
    }
    return above / below;
  };
}

/** Sides of the polygon that stands for a post. */
const POST_SIDES = 12;

/** A regular polygon of the post's area, so that it has about the post's capacitance. */
function postPolygon({ x, y, radius }: PlanShape['posts'][number]): Polygon {
  const side = (2 * Math.PI) / POST_SIDES;
  const corner = radius * Math.sqrt(side / Math.sin(side));
  return Array.from({ length: POST_SIDES }, (_, i) => i * side).flatMap((angle) => [
    x + corner * Math.cos(angle),
    y + corner * Math.sin(angle),
  ]);
}

/** What does not turn: the stators beside their posts, and the posts beside them. */
function standingOf({ stators, posts }: PlanShape): Standing[] {
  const columns = posts.map((post) => ({ stator: post.stator, polygon: postPolygon(post) }));
  return [
    ...stators.map((polygon, stator): Standing => ({
      kind: 'stator',
      stator,
      pieces: columns.reduce(
        (pieces, column) => piecesBeside(pieces, column.polygon, 'outside'),
        sidesOf(polygon),
      ),
    })),
    ...columns.map(({ stator, polygon }): Standing => ({
      kind: 'post',
      stator,
      pieces: piecesBeside(sidesOf(polygon), stators[stator]!, 'outside'),
    })),
  ];
}

interface Energies {
  /** Twice the field's energy, over ε and the square of the potential: per gap and unit height. */
  readonly openSpace: number;
  /** The same of all end faces, mm; computed when asked for. */
  readonly endFaces: () => number;
}

function energiesAt(
  shape: PlanShape,
  standing: readonly Standing[],
  table: EdgeTable,
  hub: HubEdges,
  meshAngle: number,
  potentials: Potentials,
): Energies {
  const { stators, sweepRadius, endPlates } = shape;
  const { airGap: g } = shape.plates;
  const rotor = turned(shape.rotor, meshAngle);
  const rotorStanding: Standing = {
    kind: 'rotor',
    stator: -1,
    pieces: stators.reduce(
      (pieces, stator) => piecesBeside(pieces, stator, 'outside'),
      sidesOf(rotor),
    ),
  };
  const others = standing.map((part) =>
    part.kind === 'post'
      ? part
      : { ...part, pieces: piecesBeside(part.pieces, rotor, 'outside') },
  );
  const rule = wallRule(shape, table, hub, meshAngle, potentials);
  const walls = planWalls(rotorStanding, others, rule, {
    shortest: g,
    longest: sweepRadius / 4,
    grading: 1.5,
  });
  const field = planField(walls);
  const height = shape.gaps * table.height * g;
  const area = stators.reduce((sum, stator) => sum + areaOf(stator), areaOf(rotor));
  const radius = Math.sqrt(area / Math.PI);
  const faceUnder = (outermost: EndPlate): number => {
    const [thickness, deep] =
      outermost === 'rotor'
        ? [table.rotorThickness, table.rotorDeep]
        : [table.statorThickness, table.statorDeep];
    const edgeRadius = g * endEdgeRadius(thickness, deep);
    const sizes = { edgeRadius, height, radius };
    return endFaceCapacitance(outermost, rotor, stators, potentials, walls, field, sizes);
  };
  const [first, last] = endPlates;
  return {
    openSpace: field.energy,
    endFaces: () => {
      const firstFace = faceUnder(first);
      return firstFace + (last === first ? firstFace : faceUnder(last));
    },
  };
}

/**
 * A capacitance as a sum of energies, each with the weight it counts by: between two conductors
 * that are all there is, one energy; with a third, C₁₂ = (E₁ + E₂ − E₃)/2, with Eₖ the energy
 * where only k has potential.
 */
export type EnergySum = readonly { readonly weight: number; readonly potentials: Potentials }[];

/**
 * @param range first and last mesh angle wanted, rad
 * @param sum the capacitance asked for, per blade
 * @param near the share of nearly the same plates: what has changed since is carried by every
 *   second solution
 */
export function planShare(
  shape: PlanShape,
  table: EdgeTable,
  hub: HubEdges,
  [from, to]: readonly [number, number],
  sum: EnergySum,
  near: PlanShare | null = null,
): PlanShare {
  const { plates } = shape;
  const { airGap: g, rotorSector, statorSector } = plates;
  const flush = [0, rotorSector, statorSector];
  if (plates.toNextStator !== null)
    flush.push(rotorSector + statorSector - plates.toNextStator);
  else flush.push(rotorSector - Math.PI, rotorSector + statorSector - Math.PI);
  const nodes = nodesBetween(from, to, flush, (CLEAR_OF_FLUSH * g) / shape.sweepRadius);
  const few = nodes.filter((_, i) => i % 2 === 0);
  const standing = standingOf(shape);
  const solved = new Map(
    (near ? few : nodes).map((angle) => {
      const parts = sum.map(({ weight, potentials }) => ({
        weight,
        energies: energiesAt(shape, standing, table, hub, angle, potentials),
      }));
      const openSpace = parts.reduce(
        (total, { weight, energies }) => total + weight * energies.openSpace,
        -openWedges(plates, table, angle),
      );
      const endFaces = (): number =>
        parts.reduce((total, { weight, energies }) => total + weight * energies.endFaces(), 0);
      return [angle, { openSpace, endFaces }];
    }),
  );
  const endFaces = through(
    few,
    few.map((angle) => solved.get(angle)!.endFaces()),
  );
  if (!near) {
    const openSpace = through(
      nodes,
      nodes.map((angle) => solved.get(angle)!.openSpace),
    );
    return { openSpace, endFaces };
  }
  const change = through(
    few,
    few.map((angle) => solved.get(angle)!.openSpace - near.openSpace(angle)),
  );
  return { openSpace: (angle) => near.openSpace(angle) + change(angle), endFaces };
}
