import type { Derived, Design } from '@/geometry';

/** What a tool gets. It is drawn anew with every change of the design. */
export interface ToolProps {
  /** The last design that could be read from the form. */
  readonly design: Design;
  readonly section: number;
  readonly derived: Derived | null;
  /** Puts another design on the screen as one step, which `words` name: `Applied 12 plates`. */
  apply(change: (design: Design) => Design, words: string): void;
  close(): void;
}
