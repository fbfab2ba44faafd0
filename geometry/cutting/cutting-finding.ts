import type { Severity } from '../finding';
import type { Quantity } from '../parameters';

export type CuttingCode =
  | 'hole-small'
  | 'web-thin'
  | 'contour-crosses'
  | 'kerf-closes'
  | 'part-large'
  | 'reflective'
  | 'fumes'
  | 'gap-small'
  | 'lead-in-long'
  | 'no-sheet'
  | 'sheets-short';

/**
 * One thing checked for a machine and its sheets. `value` and `limit` are in kernel units of
 * `quantity`, null where there is nothing to measure; `change` says what would work and is empty
 * when nothing needs to change.
 */
export interface CuttingFinding {
  readonly code: CuttingCode;
  readonly severity: Severity;
  /** Key of the part, or null for the whole layout. */
  readonly part: string | null;
  readonly label: string;
  readonly value: number | null;
  readonly limit: number | null;
  readonly quantity: Quantity;
  readonly change: string;
}
