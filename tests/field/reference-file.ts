import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { fractions, type Case } from './cases';
import type { Refinements } from './extrapolation';
import type { Reference, ReferenceRow } from './reference';
import type { Solution } from './solve-case';
import type { StackShape } from './stack-shape';

export type ReferenceFile = 'reference.json' | 'short-stack.json';

export function readReference(file: ReferenceFile): Reference {
  const path = join(import.meta.dirname, file);
  return existsSync(path) ? JSON.parse(readFileSync(path, 'utf8')) : {};
}

const places = (value: number, digits: number) => Number(value.toFixed(digits));

function askedRefinements(): Refinements {
  const asked = process.env.REFINEMENTS ?? '1,2,3';
  const [coarse = NaN, middle = NaN, fine = NaN] = asked.split(',').map(Number);
  if (!(coarse >= 1 && middle > coarse && fine > middle)) {
    throw new Error(`REFINEMENTS ${asked}: three rising whole numbers, such as 1,2,3`);
  }
  return [coarse, middle, fine];
}

/**
 * Solves the cases named on the command line, or all, and writes each as soon as it is done.
 * Hours of computing for all of it, so the results are kept, and never made anew in CI.
 */
export function makeReference(
  file: ReferenceFile,
  cases: Case[],
  solve: (shape: StackShape, theta: number, refinements: Refinements) => Solution,
): void {
  if (process.env.CI) throw new Error(`${file} is not made anew in CI`);
  const asked = process.argv.slice(2);
  for (const name of asked) {
    if (!cases.some((c) => c.name === name)) {
      throw new Error(`no case ${name}; there are ${cases.map((c) => c.name).join(', ')}`);
    }
  }
  const refinements = askedRefinements();
  for (const { name, title, shape } of cases) {
    if (asked.length > 0 && !asked.includes(name)) continue;
    const rows: ReferenceRow[] = [];
    for (const fraction of fractions) {
      const began = Date.now();
      const found = solve(shape, fraction * shape.travel, refinements);
      rows.push({
        fraction,
        capacitance: places(found.value, 4),
        uncertainty: places(found.uncertainty, 4),
        order: places(found.order, 2),
        onGrids: found.onGrids.map((c) => places(c, 4)),
      });
      console.log(name, JSON.stringify(rows.at(-1)), `${(Date.now() - began) / 1000} s`);
    }
    const all = readReference(file);
    all[name] = { title, shape, refinements, rows };
    writeFileSync(join(import.meta.dirname, file), `${JSON.stringify(all, null, 2)}\n`);
  }
}
