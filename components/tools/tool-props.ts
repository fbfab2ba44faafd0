import type { Derived, Design } from '@/geometry';

/** The stored version that what is on the screen began from. */
export interface Saved {
  readonly id: string;
  readonly version: number;
  /** Has anything been changed since? */
  readonly changed: boolean;
}

/** What a tool gets. It is drawn anew with every change of the design. */
export interface ToolProps {
  /** The last design that could be read from the form. */
  readonly design: Design;
  readonly section: number;
  readonly derived: Derived | null;
  readonly saved: Saved;
  /** Puts another design on the screen as one step, which `words` name: `Applied 12 plates`. */
  apply(change: (design: Design) => Design, words: string): void;
  close(): void;
}
