/**
 * The field of a stack, put together: each gap, from mid-plane to mid-plane of neighbouring
 * plates, has
 *
 *   C/ε = A/g + Fo·(outer edge over the stator) + Fc·(cut-out under the blade)
 *       + Fh·(cut-out beside the blade) + radial edges + Z·(open space in plan)
 *
 * and the stack its end faces besides. Edges: geometry/field/edge-table.ts and hub-edges.ts;
 * radial edges: radial-edges.ts; open space and end faces: plan-share.ts. The composite is this
 * project's own; what it is held against is in tests/field. Left out: insulators, frame and what
 * stands near the end faces.
 */

import { edgeTable, type EdgeTable } from './edge-table';
import { hubEdges, type HubEdges } from './hub-edges';
import type { PlanShare } from './plan-share';
import { coveredRadius, radialEdges, type EdgePlates } from './radial-edges';

/** Sizes that the edges of a section depend on, mm. */
export interface EdgeSizes {
  readonly airGap: number;
  readonly rotorThickness: number;
  readonly statorThickness: number;
  readonly hubRadius: number;
  readonly spacerRadius: number;
  readonly cutoutRadius: number;
  readonly overhang: number;
}

/** Gains of all edges of a section; computed once for its sizes. */
export interface SectionEdges {
  readonly table: EdgeTable;
  readonly hub: HubEdges;
  /** Gain of the rotor's outer edge under the stator's overhang, per length, over ε. */
  readonly outerEdge: number;
  /** Height of the half cell, mm. */
  readonly height: number;
}

/** Keeps what was solved, by its ratios: the same sizes come back at every keystroke. */
export interface EdgeCache {
  readonly tables: Map<string, EdgeTable>;
  readonly hubs: Map<string, HubEdges>;
}

export function createEdgeCache(): EdgeCache {
  return { tables: new Map(), hubs: new Map() };
}

/** Solutions kept at most; the oldest goes first. */
const KEPT = 64;

function kept<T>(map: Map<string, T>, key: string, solve: () => T): T {
  const known = map.get(key);
  if (known !== undefined) return known;
  const solved = solve();
  if (map.size >= KEPT) map.delete(map.keys().next().value!);
  map.set(key, solved);
  return solved;
}

export function sectionEdges(sizes: EdgeSizes, cache: EdgeCache): SectionEdges {
  const { airGap: g } = sizes;
  const tr = sizes.rotorThickness / g;
  const ts = sizes.statorThickness / g;
  const proud = (sizes.hubRadius - sizes.spacerRadius) / g;
  const clear = (sizes.cutoutRadius - sizes.hubRadius) / g;
  const table = kept(cache.tables, `${tr} ${ts}`, () => edgeTable(tr, ts));
  const hub = kept(cache.hubs, `${tr} ${ts} ${proud} ${clear}`, () =>
    hubEdges(
      { airGap: 1, rotorThickness: tr, statorThickness: ts },
      proud,
      clear,
      table.statorSetback,
    ),
  );
  return {
    table,
    hub,
    outerEdge: table.rotorInside(sizes.overhang / g),
    height: table.height * g,
  };
}

/** How the plates of one gap lie over each other at a mesh angle; geometry/overlap.ts. */
export interface OverlapSizes {
  /** mm² */
  readonly area: number;
  /** Length of the rotor's outer curve over the stator, and of the cut-out over the rotor, mm. */
  readonly rotorEdge: number;
  readonly cutoutEdge: number;
}

/** Capacitance of one gap at a mesh angle over ε, mm; without a share, the edges alone. */
export function gapCapacitance(
  edges: SectionEdges,
  plates: EdgePlates,
  share: PlanShare | null,
  { area, rotorEdge, cutoutEdge }: OverlapSizes,
  meshAngle: number,
): number {
  const beside = plates.cutoutRadius * plates.statorSector - cutoutEdge;
  return (
    area / plates.airGap +
    edges.outerEdge * rotorEdge +
    edges.hub.cutoutUnderBlade * cutoutEdge +
    edges.hub.besideBlade * beside +
    radialEdges(plates, edges.table, meshAngle) +
    (share ? edges.height * share.openSpace(meshAngle) : 0)
  );
}

/** Capacitance of all gaps and both end faces at a mesh angle over ε, mm. */
export function stackCapacitance(
  gaps: number,
  edges: SectionEdges,
  plates: EdgePlates,
  share: PlanShare | null,
  overlap: OverlapSizes,
  meshAngle: number,
): number {
  const inGaps = gaps * gapCapacitance(edges, plates, share, overlap, meshAngle);
  return inGaps + (share ? share.endFaces(meshAngle) : 0);
}

/** What the inverse needs to know of the field of a blade, mm and mm/rad, over ε and per gap. */
export interface CellField {
  readonly outerEdge: number;
  readonly cutoutUnderBlade: number;
  readonly besideBlade: number;
  /** Gain of the stator's first edge where the rotor covers it beyond the leading edge. */
  readonly coveredEdge: number;
  /** d/dθ of radial edges, open space and end faces, without the covered edge's part in r'. */
  readonly slopeOfRest: (meshAngle: number) => number;
}

/** Points of the turn at which the rest is differenced. */
const SLOPE_STEPS = 180;

/**
 * @param range mesh angles between which slopes are wanted, rad
 */
export function cellField(
  gaps: number,
  edges: SectionEdges,
  plates: EdgePlates,
  share: PlanShare | null,
  [from, to]: readonly [number, number],
): CellField {
  const { table, hub, outerEdge, height } = edges;
  const step = (to - from) / SLOPE_STEPS;
  const rest = Float64Array.from({ length: SLOPE_STEPS + 3 }, (_, i) => {
    const angle = from + (i - 1) * step;
    const covered = angle > 0 ? coveredRadius(plates, angle) : plates.rotorRadius(0);
    const plan = share ? height * share.openSpace(angle) + share.endFaces(angle) / gaps : 0;
    return radialEdges(plates, table, angle) - table.statorDeep * covered + plan;
  });
  return {
    outerEdge,
    cutoutUnderBlade: hub.cutoutUnderBlade,
    besideBlade: hub.besideBlade,
    coveredEdge: table.statorDeep,
    slopeOfRest: (angle) => {
      const position = Math.min(Math.max((angle - from) / step, 0), SLOPE_STEPS);
      const i = Math.min(Math.floor(position), SLOPE_STEPS - 1);
      const slopeAt = (k: number): number => (rest[k + 2]! - rest[k]!) / (2 * step);
      return slopeAt(i) + (slopeAt(i + 1) - slopeAt(i)) * (position - i);
    },
  };
}
