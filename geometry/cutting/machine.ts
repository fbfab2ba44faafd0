/** What a cutting machine can do. mm. A workshop keeps its own; the kernel only reads them. */

import type { Material } from '../material';

export type CuttingProcess = 'laser' | 'waterjet' | 'etching' | 'milling';

export interface Machine {
  readonly name: string;
  readonly process: CuttingProcess;
  /** Width that the cut takes away. */
  readonly kerf: number;
  /** Smallest hole or slot, and smallest web left standing, as multiples of the sheet's thickness. */
  readonly smallestHole: number;
  readonly smallestWeb: number;
  /** Bed. */
  readonly bedWidth: number;
  readonly bedHeight: number;
  /** Is it rated for bright copper, brass and aluminium? */
  readonly reflective: boolean;
  /** Way from the piercing to the contour; 0 starts on the contour. */
  readonly leadIn: number;
  /** Bridges left in each outer contour, and their width; 0 for none. */
  readonly bridges: number;
  readonly bridgeWidth: number;
  /** mm/s and s, for the estimate of time. */
  readonly feed: number;
  readonly pierceTime: number;
}

/** Sheet in store. mm. */
export interface Sheet {
  readonly material: Material | 'insulator';
  readonly thickness: number;
  /** ±, from its standard. */
  readonly thicknessTolerance: number;
  readonly width: number;
  readonly height: number;
  readonly count: number;
}
