/** Prints the tables of README.md: npx tsx tests/field/print-tables.ts */
import { compositeOf } from '../support/composite';
import reference from './reference.json';
import shortStacks from './short-stack.json';
import type { StackShape } from './stack-shape';

interface Solved {
  readonly title: string;
  readonly shape: StackShape;
  readonly rows: readonly {
    readonly fraction: number;
    readonly capacitance: number;
    readonly uncertainty: number;
  }[];
}

const signed = (value: number): string =>
  `${value < 0 ? '−' : '+'}${Math.abs(value).toFixed(3)}`;

function print(solved: Record<string, unknown>, what: 'halfCell' | 'shortStack'): void {
  const all = Object.values(solved) as Solved[];
  const fractions = all[0]!.rows.map(({ fraction }) => fraction);
  const line = (cells: readonly (string | number)[]): void =>
    console.log(`| ${cells.join(' | ')} |`);
  line(['geometry', 'range, mm', 'uncertainty', ...fractions]);
  line(['---', '---', '---', ...fractions.map(() => '---')]);
  for (const { title, shape, rows } of all) {
    const range = rows.at(-1)!.capacitance - rows[0]!.capacitance;
    const percent = (value: number): number => (100 * value) / range;
    const uncertainty = Math.max(...rows.map((row) => percent(row.uncertainty)));
    const model = compositeOf(shape, fractions)[what];
    line([
      title,
      Math.round(range),
      uncertainty.toFixed(3),
      ...rows.map((row, i) => signed(percent(model[i]! - row.capacitance))),
    ]);
  }
  console.log();
}

print(reference, 'halfCell');
print(shortStacks, 'shortStack');
