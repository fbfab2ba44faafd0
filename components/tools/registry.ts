import dynamic from 'next/dynamic';
import type { ComponentType } from 'react';
import type { ToolName } from './places';
import type { ToolProps } from './tool-props';

interface Tool {
  readonly title: string;
  readonly Component: ComponentType<ToolProps>;
}

/** Every tool, each loaded when it is opened; and this list with the first of them. */
export const tools: Readonly<Record<ToolName, Tool>> = {
  'old-plate': {
    title: 'Copy an old plate',
    Component: dynamic(() => import('./old-plate/old-plate')),
  },
  'printed-dial': {
    title: 'Printed dial',
    Component: dynamic(() => import('./printed-dial/printed-dial')),
  },
  'two-circuits': {
    title: 'Two circuits on one shaft',
    Component: dynamic(() => import('./two-circuits/two-circuits')),
  },
  'plates-that-fit': {
    title: 'Plates that fit',
    Component: dynamic(() => import('./plates-that-fit/plates-that-fit')),
  },
  tolerance: {
    title: 'Tolerance',
    Component: dynamic(() => import('./tolerance/tolerance')),
  },
  'voltage-and-loss': {
    title: 'Voltage, loss and drift',
    Component: dynamic(() => import('./voltage-and-loss/voltage-and-loss')),
  },
  dial: {
    title: 'Dial',
    Component: dynamic(() => import('./dial/dial-tool')),
  },
  sheets: {
    title: 'Lay out on sheets',
    Component: dynamic(() => import('./sheets/sheets')),
  },
};
