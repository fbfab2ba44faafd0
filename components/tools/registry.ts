import dynamic from 'next/dynamic';
import type { ComponentType } from 'react';
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

interface Tool {
  readonly title: string;
  /** How the button says it that opens the tool. */
  readonly opener: string;
  readonly Component: ComponentType<ToolProps>;
}

/** Every tool is loaded when it is opened. */
export const tools: Record<string, Tool> = {
  'old-plate': {
    title: 'Copy an old plate',
    opener: 'Copy an old plate',
    Component: dynamic(() => import('./old-plate/old-plate')),
  },
  'plates-that-fit': {
    title: 'Plates that fit',
    opener: 'Which plates and gap fit',
    Component: dynamic(() => import('./plates-that-fit/plates-that-fit')),
  },
  tolerance: {
    title: 'Tolerance',
    opener: 'What tolerances do to it',
    Component: dynamic(() => import('./tolerance/tolerance')),
  },
  'voltage-and-loss': {
    title: 'Voltage, loss and drift',
    opener: 'Voltage, loss and drift',
    Component: dynamic(() => import('./voltage-and-loss/voltage-and-loss')),
  },
  sheets: {
    title: 'Lay out on sheets',
    opener: 'Lay out on sheets',
    Component: dynamic(() => import('./sheets/sheets')),
  },
};

export type ToolName = string;

/** Where on the design screen a tool is opened from. */
export type ToolPlace = 'law' | 'stack' | 'checks' | 'held' | 'files' | 'chart';

export const toolsAt: Readonly<Record<ToolPlace, readonly ToolName[]>> = {
  law: ['old-plate'],
  stack: ['plates-that-fit'],
  checks: ['voltage-and-loss'],
  held: ['tolerance'],
  files: ['sheets'],
  chart: [],
};
