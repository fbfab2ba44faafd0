/** The plates in plan, and what their stacks are as walls of the open space between them. */

import type { EdgeTable } from './edge-table';
import type { HubEdges } from './hub-edges';
import type { Polygon, Standing, Wall } from './plan-walls';
import type { EdgePlates } from './radial-edges';

/** Which plate lies outermost at an end of the stack. */
export type EndPlate = 'rotor' | 'stator';

/** Potentials of the rotor and of each stator. */
export interface Potentials {
  readonly rotor: number;
  readonly stators: readonly number[];
}

/** A post with its spacers, as a round column over the height of the stack, mm. */
export interface PlanPost {
  readonly x: number;
  readonly y: number;
  readonly radius: number;
  /** Which stator it carries. */
  readonly stator: number;
}

export interface PlanShape {
  readonly plates: EdgePlates;
  /** Rotor at mesh angle 0, hub included. */
  readonly rotor: Polygon;
  /** Stators where they stand, ears included, and how far each is turned from the first, rad. */
  readonly stators: readonly Polygon[];
  readonly statorAngles: readonly number[];
  /** How far each blade lies behind the first, rad. */
  readonly lobeAngles: readonly number[];
  /** Inside the stators' ears or beside them. */
  readonly posts: readonly PlanPost[];
  readonly hubRadius: number;
  /** Longest radius of the rotor, mm. */
  readonly sweepRadius: number;
  readonly gaps: number;
  /** The outermost plate at either end of the stack. */
  readonly endPlates: readonly [EndPlate, EndPlate];
}

export function turned(polygon: Polygon, angle: number): number[] {
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

/** Mirrored in x and turned by an angle; counter-clockwise again. */
function mirroredPolygon(polygon: Polygon, angle: number): number[] {
  const flipped: number[] = [];
  for (let i = polygon.length - 2; i >= 0; i -= 2) flipped.push(polygon[i]!, -polygon[i + 1]!);
  return turned(flipped, angle);
}

/** The same plates seen from the other side, the second stator's last edge as the first's first. */
export function mirroredShape(shape: PlanShape): PlanShape {
  const { plates, statorAngles } = shape;
  const { rotorSector, statorSector } = plates;
  const first = mirroredPolygon(shape.stators[0]!, statorSector);
  return {
    ...shape,
    plates: {
      ...plates,
      rotorRadius: (phi) => plates.rotorRadius(rotorSector - phi),
      statorFirst: plates.statorLast,
      statorLast: plates.statorFirst,
    },
    rotor: mirroredPolygon(shape.rotor, -rotorSector),
    stators: statorAngles.map((standsAt) => turned(first, standsAt)),
    posts: shape.posts.map((post) => {
      const [x, y] = turned([post.x, -post.y], statorSector);
      return { ...post, x: x!, y: y! };
    }),
  };
}

/** rad. A wall this near a radial line lies on it. */
const ON_LINE = 1e-3;

/** Angle brought to −π … π. */
function wrapped(angle: number): number {
  return angle - 2 * Math.PI * Math.round(angle / (2 * Math.PI));
}

/** A blade and a stator: where their edges lie, and how far apart they are. */
interface Pair {
  readonly stator: number;
  /** Bearings of the blade's trailing edge and of the stator's last, rad. */
  readonly trailing: number;
  readonly last: number;
  /** Trailing edge before the stator's first, and leading edge before the stator's last, rad. */
  readonly behind: number;
  readonly short: number;
}

function pairsAt({ plates, statorAngles, lobeAngles }: PlanShape, meshAngle: number): Pair[] {
  const { rotorSector, statorSector } = plates;
  return statorAngles.flatMap((standsAt, stator) =>
    lobeAngles.map((lobe): Pair => {
      const leading = meshAngle - lobe;
      // Mesh angle in the stator's own frame.
      const ahead = leading - standsAt;
      const own = ahead < -Math.PI / 2 ? ahead + 2 * Math.PI : ahead;
      return {
        stator,
        trailing: leading - rotorSector,
        last: standsAt + statorSector,
        behind: rotorSector - own,
        short: statorSector - own,
      };
    }),
  );
}

/**
 * What the walls are at a mesh angle. A stack acts with its own potential, but beside a radial
 * edge behind which the other stack's edge lies flush, both share the wall: its potential goes to
 * the mean of both as the edges close up, with the slowest mode of the strip between them.
 */
export function wallRule(
  shape: PlanShape,
  table: EdgeTable,
  hub: HubEdges,
  meshAngle: number,
  potentials: Potentials,
): (standing: Standing, x: number, y: number) => Wall {
  const { plates, hubRadius, posts } = shape;
  const { airGap: g, edgeOffset, cutoutRadius } = plates;
  const leadingRadius = plates.rotorRadius(0);
  const pairs = pairsAt(shape, meshAngle);
  // The strip beside a plate reaches from its face to the other's mid-plane.
  const strip = (ownThickness: number): number =>
    (2 * (table.height - ownThickness / 2) * g) / Math.PI;
  const shared = (apart: number, reach: number): number =>
    apart < 0 ? 0 : Math.exp(-apart / reach) / 2;
  const rotorStrip = strip(table.rotorThickness);
  const statorStrip = strip(table.statorThickness);
  /** A post just behind the edge is itself the wall. */
  const toPost = (x: number, y: number): number =>
    posts.reduce((least, post) => {
      const apart = Math.hypot(x - post.x, y - post.y) - post.radius;
      return Math.min(least, Math.max(0, apart));
    }, Infinity);

  const rotorWall = (radius: number, bearing: number): Wall => {
    const own = potentials.rotor;
    if (radius < hubRadius * 1.02) return { potential: own, setback: hub.hubSetback * g };
    let potential = own;
    for (const { stator, trailing, behind } of pairs) {
      if (radius < cutoutRadius || behind > Math.PI / 2) continue;
      if (Math.abs(wrapped(bearing - trailing)) >= ON_LINE) continue;
      const apart = radius * Math.sin(behind) + edgeOffset;
      potential += (potentials.stators[stator]! - own) * shared(apart, rotorStrip);
    }
    return { potential, setback: table.rotorSetback * g };
  };
  const statorWall = (which: number, radius: number, bearing: number): number => {
    const own = potentials.stators[which]!;
    let potential = own;
    for (const { stator, last, short } of pairs) {
      if (stator !== which || radius > leadingRadius || Math.abs(short) > Math.PI / 2) continue;
      const line = last - (edgeOffset === 0 ? 0 : Math.asin(edgeOffset / radius));
      if (Math.abs(wrapped(bearing - line)) >= ON_LINE) continue;
      const apart = radius * Math.sin(short) - edgeOffset;
      potential += (potentials.rotor - own) * shared(apart, statorStrip);
    }
    return potential;
  };
  return ({ kind, stator }, x, y) => {
    if (kind === 'post') return { potential: potentials.stators[stator]!, setback: 0 };
    const radius = Math.hypot(x, y);
    const bearing = Math.atan2(y, x);
    if (kind === 'rotor') return rotorWall(radius, bearing);
    const setback = Math.min(table.statorSetback * g, toPost(x, y));
    return { potential: statorWall(stator, radius, bearing), setback };
  };
}
