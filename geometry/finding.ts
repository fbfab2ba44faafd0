import type { Quantity } from './parameters';

export type Severity = 'ok' | 'warn' | 'fail';

export type FindingCode =
  | 'range-infeasible'
  | 'outline-infeasible'
  | 'plate-counts'
  | 'turn'
  | 'own-law'
  | 'tracking'
  | 'table-span'
  | 'table-rough'
  | 'law-held'
  | 'law-rises'
  | 'open-capacitance'
  | 'blade-narrow'
  | 'radius'
  | 'depth'
  | 'gap-voltage'
  | 'post-clearance'
  | 'ears-crowded'
  | 'overhang-short'
  | 'cutout-clearance'
  | 'spacer-proud'
  | 'hole-small'
  | 'web-thin'
  | 'slots'
  | 'frame';

/**
 * One thing the kernel checked. `value` and `limit` are in kernel units of `quantity`;
 * `change` says what would put it right and is empty when nothing needs to be.
 */
export interface Finding {
  readonly code: FindingCode;
  readonly severity: Severity;
  /** Index of the section it belongs to, or null for the whole capacitor. */
  readonly section: number | null;
  readonly label: string;
  readonly value: number;
  readonly limit: number;
  readonly quantity: Quantity;
  readonly change: string;
  /** Parameters to change, the most useful first: keys of the parameter table. */
  readonly parameters: readonly string[];
}
