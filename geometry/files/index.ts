/** Files written from derived plates. Kept out of geometry/index.ts: pages don't need them. */

import type { Derived } from '../derived';

export interface CutFile {
  /** Carries design, part, material, thickness and quantity. */
  readonly name: string;
  /** What it holds, for a person. */
  readonly label: string;
  readonly kind: 'dxf' | 'svg' | 'csv' | 'json';
  readonly mediaType: string;
  readonly text: string;
}

/** All files of a design; the same design and name give the same bytes. */
export function cutFiles(designName: string, derived: Derived): CutFile[] {
  throw new Error(`not written yet: ${designName} ${derived.kernel}`);
}
