/**
 * Gain of the radial edges of rotor and stator at a mesh angle: each pair of edges counts by its
 * distance apart, read from the edge table and summed along the radius.
 */

import type { EdgeTable } from './edge-table';

/** Two plates in plan. Angles in rad, lengths in mm. */
export interface EdgePlates {
  /** Rotor radius at an angle behind the leading edge. */
  readonly rotorRadius: (phi: number) => number;
  /** Stator radius at its first and at its last edge. */
  readonly statorFirst: number;
  readonly statorLast: number;
  readonly rotorSector: number;
  readonly statorSector: number;
  readonly cutoutRadius: number;
  /** How far both stator edges are moved into the stator, parallel to themselves. */
  readonly edgeOffset: number;
  readonly airGap: number;
  /**
   * From the stator's first edge round to the first edge of the stator whose last edge the
   * trailing edge faces: a whole turn, half of one with two blades; null where another stator
   * stands between.
   */
  readonly toNextStator: number | null;
}

/** Abscissae and weights of Gauss and Legendre's rule of ten points on −1 to 1, one half. */
const ABSCISSAE = [
  0.9739065285171717, 0.8650633666889845, 0.6794095682990244, 0.4333953941292472,
  0.1488743389816312,
];
const WEIGHTS = [
  0.0666713443086881, 0.1494513491505806, 0.219086362515982, 0.2692667193099963,
  0.2955242247147529,
];

function rule(from: number, to: number, density: (radius: number) => number): number {
  const middle = (from + to) / 2;
  const half = (to - from) / 2;
  let sum = 0;
  for (let i = 0; i < ABSCISSAE.length; i++) {
    const x = half * ABSCISSAE[i]!;
    sum += WEIGHTS[i]! * (density(middle - x) + density(middle + x));
  }
  return sum * half;
}

/** Integral along an edge: edges come nearest at the inner end, so that half is done by itself. */
function along(from: number, to: number, density: (radius: number) => number): number {
  if (to <= from) return 0;
  const middle = Math.sqrt(from * to);
  return rule(from, middle, density) + rule(middle, to, density);
}

/** Distance per radius of a point from a radial line an angle away; beyond 90° far enough. */
function apartPerRadius(angle: number): number {
  return Math.sin(Math.min(Math.max(angle, -Math.PI / 2), Math.PI / 2));
}

/**
 * What the open space between two facing radial edges would have by itself, between walls set
 * back behind them, per unit height: ∫ dρ/(gap + setbacks) over the radii at which
 * gap = ρ·angle + offset is not negative.
 */
function wedge(
  from: number,
  to: number,
  angle: number,
  offset: number,
  setbacks: number,
): number {
  const start = angle > 0 ? Math.max(from, -offset / angle) : from;
  const end = angle < 0 ? Math.min(to, -offset / angle) : to;
  if (end <= start) return 0;
  const first = start * angle + offset + setbacks;
  const last = end * angle + offset + setbacks;
  const change = (last - first) / first;
  return Math.abs(change) < 1e-6 ? (end - start) / first : Math.log1p(change) / angle;
}

/** Radius out to which the rotor covers the stator's first edge; the cut-out's if not at all. */
export function coveredRadius(plates: EdgePlates, meshAngle: number): number {
  const { rotorRadius, rotorSector, edgeOffset, cutoutRadius } = plates;
  const clamp = (phi: number): number => Math.min(Math.max(phi, 0), rotorSector);
  let radius = rotorRadius(clamp(meshAngle));
  if (edgeOffset === 0) return radius;
  // The edge lies asin(offset/ρ) from its radial line.
  for (let pass = 0; pass < 4; pass++) {
    const behind = meshAngle - Math.asin(Math.min(1, edgeOffset / radius));
    if (behind < 0 && edgeOffset > 0) {
      const reach =
        meshAngle > 0 ? edgeOffset / Math.sin(Math.min(meshAngle, Math.PI / 2)) : Infinity;
      return reach < rotorRadius(0) ? rotorRadius(0) : cutoutRadius;
    }
    radius = rotorRadius(clamp(behind));
  }
  return radius;
}

/** The open wedges beside the rotor at a mesh angle, per unit height: both sides. */
export function openWedges(plates: EdgePlates, table: EdgeTable, meshAngle: number): number {
  const { airGap: g, cutoutRadius: rc, rotorSector, statorSector, edgeOffset: off } = plates;
  const setbacks = (table.rotorSetback + table.statorSetback) * g;
  const first = Math.min(plates.rotorRadius(0), plates.statorFirst);
  const last = Math.min(plates.rotorRadius(rotorSector), plates.statorLast);
  const leading = wedge(rc, first, -meshAngle, off, setbacks);
  if (plates.toNextStator === null) return leading;
  const tail = plates.toNextStator + meshAngle - rotorSector - statorSector;
  return leading + wedge(rc, last, tail, off, setbacks);
}

/**
 * Gain of all radial edges at a mesh angle, over ε and per gap, mm, without the area. The
 * {@link openWedges} are in it, so that it goes smoothly through the angle at which edges pass.
 * @param meshAngle rad; 0 where the leading edge stands over the stator's first
 */
export function radialEdges(plates: EdgePlates, table: EdgeTable, meshAngle: number): number {
  const { airGap: g, cutoutRadius: rc, rotorSector, statorSector, edgeOffset: off } = plates;
  const leading = plates.rotorRadius(0);
  const trailing = plates.rotorRadius(rotorSector);
  /** Edges that face opposite ways, overlapping by x gaps or, negative, apart. */
  const opposed = (x: number): number => (x > 0 ? table.overlapping(x) : table.apart(-x));

  let sum = table.height * g * openWedges(plates, table, meshAngle);
  if (plates.toNextStator !== null) {
    const tailApart = apartPerRadius(
      plates.toNextStator + meshAngle - rotorSector - statorSector,
    );
    sum += along(rc, Math.min(trailing, plates.statorLast), (radius) =>
      opposed(-(radius * tailApart + off) / g),
    );
  }
  const firstApart = apartPerRadius(meshAngle);
  const first = (radius: number): number => (radius * firstApart - off) / g;
  if (meshAngle <= 0) {
    return (
      sum + along(rc, Math.min(leading, plates.statorFirst), (radius) => opposed(first(radius)))
    );
  }

  // The rotor covers the stator's first edge out to this radius.
  const covered = coveredRadius(plates, meshAngle);
  const both = Math.min(leading, covered);
  sum += along(rc, both, (radius) => opposed(first(radius)));
  sum +=
    covered > both ? (covered - both) * table.statorDeep : (leading - both) * table.rotorDeep;

  // Leading edge near the stator's last: inside it, or already past it.
  const short = statorSector - meshAngle;
  const shortApart = apartPerRadius(short);
  sum += along(rc, leading, (radius) => {
    const x = (radius * shortApart - off) / g;
    return (x >= 0 ? table.rotorInside(x) : table.statorInside(-x)) - table.rotorDeep;
  });
  if (short < 0) {
    const past = plates.rotorRadius(Math.min(-short, rotorSector));
    sum += (past - leading) * table.statorDeep;
  }

  // Trailing edge near the stator's first: still outside it, or inside.
  const behind = rotorSector - meshAngle;
  const behindApart = apartPerRadius(behind);
  sum += along(rc, covered, (radius) => {
    const x = (radius * behindApart + off) / g;
    return (x >= 0 ? table.statorInside(x) : table.rotorInside(-x)) - table.statorDeep;
  });
  return sum;
}
