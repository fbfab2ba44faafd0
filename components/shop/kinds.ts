import type { Parameter } from '@/geometry';
import { formatQuantity } from '@/geometry';
import { toleranceOf } from '@/geometry/cutting/starting-values';
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
  /** What to give where the label does not say it. */
  readonly hints: Readonly<Record<string, string>>;
}

const standardTolerances = [0.5, 0.8, 1, 1.5, 2]
  .map((thickness) => `± ${toleranceOf(thickness)} at ${thickness}`)
  .join(', ');

export const shopKinds: Readonly<Record<ShopKind, Kind>> = {
  machines: {
    title: 'Machines',
    one: 'a machine',
    empty:
      'No machine yet. Add the one that cuts your plates: its kerf and its smallest hole decide what a layout and its checks say.',
    parameters: machineParameters,
    check: checkMachine,
    shown: ['process', 'kerf', 'smallestHole', 'bedWidth', 'bedHeight', 'reflective'],
    hints: {
      kerf: 'Width of what a cut takes away, measured on the sheet you cut most.',
      leadIn: 'From the piercing to the contour; 0 for none.',
      bridges: 'They hold a part in its sheet until it is broken out; 0 leaves it loose.',
      feed: 'Along the cut. With the piercings it gives the time of a sheet.',
      pierceTime: 'Each piercing, until the cut begins.',
    },
  },
  sheets: {
    title: 'Sheet in store',
    one: 'a sheet',
    empty: 'No sheet yet. Add what lies in the rack: layouts are made on its sizes.',
    parameters: sheetParameters,
    check: checkSheet,
    shown: ['material', 'thickness', 'thicknessTolerance', 'width', 'height', 'count'],
    hints: {
      thicknessTolerance: `Aluminium alloys of group II to EN 485-4: ${standardTolerances} mm. Other metals as their own standard says.`,
    },
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
