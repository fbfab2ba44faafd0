/** Edges round the shaft: the stator's cut-out against the hub and the wall of rotor spacers. */

import { cellHeight, edgeGain, type Cell } from './cross-section';

export interface HubEdges {
  /** Gain of the cut-out under the blade, per unit length, over ε. */
  readonly cutoutUnderBlade: number;
  /** What cut-out and hub have beside the blade, less what two set-back walls would have. */
  readonly besideBlade: number;
  /** How far behind the hub's edge its stack acts as a wall, in gaps. */
  readonly hubSetback: number;
}

/**
 * All in air gaps.
 * @param hubOverSpacer how far the hub stands out from its spacer
 * @param cutoutToHub from the hub's edge to the cut-out
 * @param statorSetback of the stator's edge, from the edge table
 */
export function hubEdges(
  cell: Cell,
  hubOverSpacer: number,
  cutoutToHub: number,
  statorSetback: number,
): HubEdges {
  const height = cellHeight(cell);
  const proud = Math.max(hubOverSpacer, 1e-4);
  const reach = 4 * height;
  const hubSetback = height / edgeGain(cell, ['rotor', 'open'], [1, 0])([proud, reach]) - reach;
  const facing = edgeGain(
    cell,
    ['rotor', 'open', 'stator'],
    [1, null],
  )([proud, cutoutToHub, Infinity]);
  return {
    cutoutUnderBlade: edgeGain(
      cell,
      ['both', 'rotor'],
      [null, 1],
    )([Infinity, proud + cutoutToHub]),
    besideBlade: facing - height / (cutoutToHub + hubSetback + statorSetback),
    hubSetback,
  };
}
