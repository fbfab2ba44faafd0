import type { Refinements } from './extrapolation';
import type { StackShape } from './stack-shape';

/** reference.json, by case name. */
export type Reference = Record<string, ReferenceCase>;

export interface ReferenceCase {
  title: string;
  shape: StackShape;
  refinements: Refinements;
  rows: ReferenceRow[];
}

export interface ReferenceRow {
  /** Mesh angle over travel. */
  fraction: number;
  /** C/ε per half period (rotor midplane to stator midplane), mm. */
  capacitance: number;
  /** Half-width, mm. */
  uncertainty: number;
  /** Fitted order of the error, and the three grids' own results. */
  order: number;
  onGrids: number[];
}
