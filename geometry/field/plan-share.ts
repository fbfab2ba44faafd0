/**
 * What the plan view adds to the capacitance over the whole turn: the open space between the
 * plates of each gap, without the open wedges that facing radial edges would have by themselves,
 * and the end faces of the stack. Both change slowly with the angle, so that a few solutions
 * carry them.
 */

import type { EdgeTable } from './edge-table';
import type { HubEdges } from './hub-edges';
import { endEdgeRadius, endFaceCapacitance, type EndPlate } from './end-face';
import { planField } from './plan-view';
import {
  piecesBeside,
  planWalls,
  sidesOf,
  type Piece,
  type Polygon,
  type Wall,
  type WallKind,
} from './plan-walls';
import { openWedges, type EdgePlates } from './radial-edges';

/** A post with its spacers, as a round column over the height of the stack, mm. */
export interface PlanPost {
  readonly x: number;
  readonly y: number;
  readonly radius: number;
}

export interface PlanShape {
  readonly plates: EdgePlates;
  /** Rotor at mesh angle 0 and stator where it stands, hub and ears included. */
  readonly rotor: Polygon;
  readonly stator: Polygon;
  /** Inside the stator's ears or beside it. */
  readonly posts: readonly PlanPost[];
  readonly hubRadius: number;
  /** Longest radius of the rotor, mm. */
  readonly sweepRadius: number;
  readonly gaps: number;
  /** The outermost plate at either end of the stack. */
  readonly endPlates: readonly [EndPlate, EndPlate];
}

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

function turned(polygon: Polygon, angle: number): number[] {
  const cos = Math.cos(angle);
  const sin = Math.sin(angle);
  const out: number[] = [];
  for (let i = 0; i < polygon.length; i += 2) {
    const x = polygon[i]!;
    const y = polygon[i + 1]!;
    out.push(x * cos - y * sin, x * sin + y * cos);
  }
  return out;
}

/** rad. A wall this near a radial line lies on it. */
const ON_LINE = 1e-3;

/** Angle brought to −π … π. */
function wrapped(angle: number): number {
  return angle - 2 * Math.PI * Math.round(angle / (2 * Math.PI));
}

/**
 * What the walls are at a mesh angle. A stack acts with its own potential, but beside a radial
 * edge behind which the other stack's edge lies flush, both share the wall: its potential goes to
 * one half as the edges close up, with the slowest mode of the strip between them.
 */
function wallsAt(
  { plates, hubRadius, posts }: PlanShape,
  table: EdgeTable,
  hub: HubEdges,
  meshAngle: number,
): (kind: WallKind, x: number, y: number) => Wall {
  const { airGap: g, rotorSector, statorSector, edgeOffset, cutoutRadius } = plates;
  const leading = plates.rotorRadius(0);
  // The strip beside a plate reaches from its face to the other's mid-plane.
  const strip = (ownThickness: number): number =>
    (2 * (table.height - ownThickness / 2) * g) / Math.PI;
  const shared = (apart: number, reach: number): number =>
    apart < 0 ? 0 : Math.exp(-apart / reach) / 2;
  /** A post just behind the edge is itself the wall. */
  const toPost = (x: number, y: number): number =>
    posts.reduce((least, post) => {
      const apart = Math.hypot(x - post.x, y - post.y) - post.radius;
      return Math.min(least, Math.max(0, apart));
    }, Infinity);
  return (kind, x, y) => {
    if (kind === 'post') return { potential: 0, setback: 0 };
    const radius = Math.hypot(x, y);
    const bearing = Math.atan2(y, x);
    if (kind === 'rotor') {
      if (radius < hubRadius * 1.02) return { potential: 1, setback: hub.hubSetback * g };
      const setback = table.rotorSetback * g;
      const behind = rotorSector - meshAngle;
      const trails = Math.abs(wrapped(bearing + behind)) < ON_LINE;
      if (!trails || radius < cutoutRadius || behind > Math.PI / 2)
        return { potential: 1, setback };
      const apart = radius * Math.sin(behind) + edgeOffset;
      return { potential: 1 - shared(apart, strip(table.rotorThickness)), setback };
    }
    const setback = Math.min(table.statorSetback * g, toPost(x, y));
    const short = statorSector - meshAngle;
    const line = statorSector - (edgeOffset === 0 ? 0 : Math.asin(edgeOffset / radius));
    const last = Math.abs(wrapped(bearing - line)) < ON_LINE;
    if (!last || radius > leading || Math.abs(short) > Math.PI / 2)
      return { potential: 0, setback };
    const apart = radius * Math.sin(short) - edgeOffset;
    return { potential: shared(apart, strip(table.statorThickness)), setback };
  };
}

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
function postPolygon({ x, y, radius }: PlanPost): Polygon {
  const corner =
    radius * Math.sqrt((2 * Math.PI) / (POST_SIDES * Math.sin((2 * Math.PI) / POST_SIDES)));
  return Array.from({ length: POST_SIDES }, (_, i) => (2 * Math.PI * i) / POST_SIDES).flatMap(
    (angle) => [x + corner * Math.cos(angle), y + corner * Math.sin(angle)],
  );
}

/** What does not turn: the stator beside its posts, and the posts beside it. */
interface Standing {
  readonly stator: readonly Piece[];
  readonly post: readonly Piece[];
}

function standingOf({ stator, posts }: PlanShape): Standing {
  const columns = posts.map(postPolygon);
  return {
    stator: columns.reduce(
      (pieces, column) => piecesBeside(pieces, column, 'outside'),
      sidesOf(stator),
    ),
    post: columns.flatMap((column) => piecesBeside(sidesOf(column), stator, 'outside')),
  };
}

function planAt(
  shape: PlanShape,
  standing: Standing,
  table: EdgeTable,
  hub: HubEdges,
  meshAngle: number,
): { openSpace: number; endFaces: () => number } {
  const { plates, stator, sweepRadius, endPlates } = shape;
  const { airGap: g } = plates;
  const rotor = turned(shape.rotor, meshAngle);
  const pieces = {
    rotor: piecesBeside(sidesOf(rotor), stator, 'outside'),
    stator: piecesBeside(standing.stator, rotor, 'outside'),
    post: standing.post,
  };
  const walls = planWalls(pieces, wallsAt(shape, table, hub, meshAngle), {
    shortest: g,
    longest: sweepRadius / 4,
    grading: 1.5,
  });
  const field = planField(walls);
  const height = shape.gaps * table.height * g;
  const radius = Math.sqrt((areaOf(rotor) + areaOf(stator)) / Math.PI);
  const faceUnder = (outermost: EndPlate): number => {
    const [thickness, deep] =
      outermost === 'rotor'
        ? [table.rotorThickness, table.rotorDeep]
        : [table.statorThickness, table.statorDeep];
    const edgeRadius = g * endEdgeRadius(thickness, deep);
    const sizes = { edgeRadius, height, radius };
    return endFaceCapacitance(outermost, rotor, stator, walls, field, sizes);
  };
  const [first, last] = endPlates;
  return {
    openSpace: field.capacitance - openWedges(plates, table, meshAngle),
    endFaces: () => {
      const firstFace = faceUnder(first);
      return firstFace + (last === first ? firstFace : faceUnder(last));
    },
  };
}

/**
 * @param range first and last mesh angle wanted, rad
 * @param near the share of nearly the same plates: what has changed since is carried by every
 *   second solution
 */
export function planShare(
  shape: PlanShape,
  table: EdgeTable,
  hub: HubEdges,
  [from, to]: readonly [number, number],
  near: PlanShare | null = null,
): PlanShare {
  const { airGap: g, rotorSector, statorSector } = shape.plates;
  const flush = [0, rotorSector, statorSector, rotorSector + statorSector - 2 * Math.PI];
  const nodes = nodesBetween(from, to, flush, (CLEAR_OF_FLUSH * g) / shape.sweepRadius);
  const few = nodes.filter((_, i) => i % 2 === 0);
  const standing = standingOf(shape);
  const solved = new Map(
    (near ? few : nodes).map((angle) => [angle, planAt(shape, standing, table, hub, angle)]),
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
