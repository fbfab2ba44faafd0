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
  const on = Infinity;
  const height = cellHeight(cell);
  const proud = Math.max(hubOverSpacer, 1e-4);
  const reach = 4 * height;
  const hubSetback =
    height /
      edgeGain(
        cell,
        [
          { kind: 'rotor', length: proud },
          { kind: 'open', length: reach },
        ],
        [1, 0],
      ) -
    reach;
  const facing = edgeGain(
    cell,
    [
      { kind: 'rotor', length: proud },
      { kind: 'open', length: cutoutToHub },
      { kind: 'stator', length: on },
    ],
    [1, null],
  );
  return {
    cutoutUnderBlade: edgeGain(
      cell,
      [
        { kind: 'both', length: on },
        { kind: 'rotor', length: proud + cutoutToHub },
      ],
      [null, 1],
    ),
    besideBlade: facing - height / (cutoutToHub + hubSetback + statorSetback),
    hubSetback,
  };
}
