export interface CutFile {
  /** Carries design, part, material, thickness and quantity. */
  readonly name: string;
  /** What it holds, for a person. */
  readonly label: string;
  readonly kind: 'dxf' | 'svg' | 'csv' | 'json';
  readonly mediaType: string;
  readonly text: string;
}
