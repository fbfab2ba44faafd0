/**
 * The plan view's share of the capacitance over the whole turn, without the open wedges that
 * facing radial edges would have by themselves: what is left changes slowly with the angle, so
 * that a few solutions carry it.
 */

import type { EdgeTable } from './edge-table';
import type { HubEdges } from './hub-edges';
import { planCapacitance } from './plan-view';
import { planWalls, type Polygon, type Wall, type WallOptions } from './plan-walls';
import { openWedges, type EdgePlates } from './radial-edges';

export interface PlanShape {
  readonly plates: EdgePlates;
  /** Rotor at mesh angle 0 and stator where it stands, hub and ears included. */
  readonly rotor: Polygon;
  readonly stator: Polygon;
  readonly hubRadius: number;
  /** Longest radius of the rotor, mm. */
  readonly sweepRadius: number;
}

/** Solutions over the turn. */
const NODES = 10;

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
  { plates, hubRadius }: PlanShape,
  table: EdgeTable,
  hub: HubEdges,
  meshAngle: number,
): (kind: 'rotor' | 'stator', x: number, y: number) => Wall {
  const { airGap: g, rotorSector, statorSector, edgeOffset, cutoutRadius } = plates;
  const leading = plates.rotorRadius(0);
  // The strip beside a plate reaches from its face to the other's mid-plane.
  const strip = (ownThickness: number): number =>
    (2 * (table.height - ownThickness / 2) * g) / Math.PI;
  const shared = (apart: number, reach: number): number =>
    apart < 0 ? 0 : Math.exp(-apart / reach) / 2;
  return (kind, x, y) => {
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
    const setback = table.statorSetback * g;
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

/**
 * @param from first and last mesh angle wanted, rad
 * @returns share at a mesh angle, over ε and per unit height
 */
export function planShare(
  shape: PlanShape,
  table: EdgeTable,
  hub: HubEdges,
  [from, to]: readonly [number, number],
): (meshAngle: number) => number {
  const { plates, sweepRadius } = shape;
  const { airGap: g, rotorSector, statorSector } = plates;
  const options: WallOptions = { shortest: g, longest: sweepRadius / 4, grading: 1.5 };
  const flush = [0, rotorSector, statorSector, rotorSector + statorSector - 2 * Math.PI];
  const nodes = nodesBetween(from, to, flush, (CLEAR_OF_FLUSH * g) / sweepRadius);
  const values = nodes.map((angle) => {
    const wallAt = wallsAt(shape, table, hub, angle);
    const walls = planWalls(turned(shape.rotor, angle), shape.stator, wallAt, options);
    return planCapacitance(walls) - openWedges(plates, table, angle);
  });
  // Barycentric weights of the nodes as they came to lie.
  const weights = nodes.map((node, i) =>
    nodes.reduce((w, other, j) => (j === i ? w : (w * (to - from)) / 4 / (node - other)), 1),
  );
  return (angle) => {
    let above = 0;
    let below = 0;
    for (let i = 0; i < NODES; i++) {
      const apart = angle - nodes[i]!;
      if (Math.abs(apart) < 1e-12) return values[i]!;
      above += (weights[i]! / apart) * values[i]!;
      below += weights[i]! / apart;
    }
    return above / below;
  };
}
