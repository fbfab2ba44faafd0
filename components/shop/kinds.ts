import type { Parameter } from '@/geometry';
import { formatQuantity } from '@/geometry';
import {
  checkMachine,
  checkSheet,
  machineParameters,
  sheetParameters,
} from '@/geometry/cutting/shop-parameters';
import type { ShopItem, ShopKind } from '@/lib/schemas/shop';

interface Kind {
  readonly title: string;
  /** `a machine`, `a sheet`. */
  readonly one: string;
  readonly empty: string;
  readonly parameters: Readonly<Record<string, Parameter>>;
  /** @throws KernelError naming field, value and range */
  readonly check: (values: Record<string, unknown>) => unknown;
  /** Which of them the table shows. */
  readonly shown: readonly string[];
}

export const shopKinds: Readonly<Record<ShopKind, Kind>> = {
  machines: {
    title: 'Machines',
    one: 'a machine',
    empty:
      'No machine yet. Add the one that cuts your plates: its kerf and its smallest hole decide what a layout and its checks say.',
    parameters: machineParameters,
    check: checkMachine,
    shown: ['process', 'kerf', 'smallestHole', 'bedWidth', 'bedHeight', 'reflective'],
  },
  sheets: {
    title: 'Sheet in store',
    one: 'a sheet',
    empty: 'No sheet yet. Add what lies in the rack: layouts are made on its sizes.',
    parameters: sheetParameters,
    check: checkSheet,
    shown: ['material', 'thickness', 'thicknessTolerance', 'width', 'height', 'count'],
  },
};

/** A value as people read it. */
export function writtenValue(parameter: Parameter, value: ShopItem['values'][string]): string {
  if (parameter.kind === 'choice') {
    return parameter.options.find((option) => option.value === value)?.label ?? String(value);
  }
  return 'quantity' in parameter && typeof value === 'number'
    ? formatQuantity(value, parameter.quantity)
    : String(value);
}
