/**
 * What a workshop says of its machines and of its sheet: every number and choice declared once,
 * as geometry/parameters.ts does for designs. mm; feed in mm/s, time in s.
 */

import { checkTable } from '../check';
import type { Parameter, ValuesOf } from '../parameters';
import type { Machine, Sheet } from './machine';

const length = (label: string, min: number, max: number, start: number) =>
  ({
    kind: 'number',
    quantity: 'length',
    group: 'sheet',
    label,
    min,
    max,
    default: start,
  }) as const;
const ratio = (label: string, min: number, max: number, start: number) =>
  ({
    kind: 'number',
    quantity: 'ratio',
    group: 'sheet',
    label,
    min,
    max,
    default: start,
  }) as const;
const count = (label: string, min: number, max: number, start: number) =>
  ({
    kind: 'number',
    quantity: 'count',
    group: 'sheet',
    label,
    min,
    max,
    default: start,
  }) as const;

export const machineParameters = {
  process: {
    kind: 'choice',
    group: 'sheet',
    label: 'Process',
    options: [
      { value: 'laser', label: 'laser' },
      { value: 'waterjet', label: 'waterjet' },
      { value: 'etching', label: 'photo-etching' },
      { value: 'milling', label: 'milling' },
    ],
    default: 'laser',
  },
  kerf: length('Kerf', 0, 10, 0.15),
  smallestHole: ratio('Smallest hole, sheet thicknesses', 0.2, 10, 1),
  smallestWeb: ratio('Smallest web, sheet thicknesses', 0.2, 10, 1),
  bedWidth: length('Bed, width', 20, 20_000, 1500),
  bedHeight: length('Bed, height', 20, 20_000, 1000),
  reflective: {
    kind: 'choice',
    group: 'sheet',
    label: 'Rated for bright copper, brass and aluminium',
    options: [
      { value: 'no', label: 'no' },
      { value: 'yes', label: 'yes' },
    ],
    default: 'no',
  },
  leadIn: length('Lead-in', 0, 20, 1),
  bridges: count('Micro-bridges in an outer contour', 0, 12, 0),
  bridgeWidth: length('Width of a micro-bridge', 0.05, 5, 0.5),
  feed: ratio('Feed, mm/s', 0.01, 1000, 50),
  pierceTime: ratio('Piercing, s', 0, 600, 0.4),
} as const satisfies Record<string, Parameter>;

export const sheetParameters = {
  material: {
    kind: 'choice',
    group: 'sheet',
    label: 'Material',
    options: [
      { value: 'brass', label: 'Brass CuZn37' },
      { value: 'aluminium', label: 'Aluminium EN AW-5754' },
      { value: 'copper', label: 'Copper Cu-ETP' },
      { value: 'steel', label: 'Steel DC01' },
      { value: 'insulator', label: 'Insulating sheet' },
    ],
    default: 'brass',
  },
  thickness: length('Thickness', 0.05, 20, 0.8),
  thicknessTolerance: length('Thickness tolerance, ±', 0, 1, 0.03),
  width: length('Width', 20, 20_000, 500),
  height: length('Height', 20, 20_000, 300),
  count: count('Sheets in store', 0, 100_000, 1),
} as const satisfies Record<string, Parameter>;

export type MachineValues = ValuesOf<typeof machineParameters>;
export type SheetValues = ValuesOf<typeof sheetParameters>;

/** @throws KernelError naming field, value and range */
export function checkMachine(input: Record<string, unknown>): MachineValues {
  return checkTable(machineParameters, input, '') as unknown as MachineValues;
}

/** @throws KernelError naming field, value and range */
export function checkSheet(input: Record<string, unknown>): SheetValues {
  return checkTable(sheetParameters, input, '') as unknown as SheetValues;
}

export function machineOf(name: string, values: MachineValues): Machine {
  return { ...values, name, reflective: values.reflective === 'yes' };
}

export const sheetOf = (values: SheetValues): Sheet => values;
