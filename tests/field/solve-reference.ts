/**
 * Writes tests/field/reference.json, case by case as each is done:
 *   npx tsx tests/field/solve-reference.ts [case …]
 * Hours of computing for all of it, so the results are kept, and never made anew in CI.
 */
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { cases, fractions } from './cases';
import { solveCase } from './solve-case';
import type { StackShape } from './stack-shape';

export interface ReferenceCase {
  title: string;
  shape: StackShape;
  rows: ReferenceRow[];
}

export interface ReferenceRow {
  /** Mesh angle over travel. */
  fraction: number;
  /** C/ε per half period, mm. */
  capacitance: number;
  /** Half-width, mm. */
  uncertainty: number;
  /** Fitted order, and the three grids' own results. */
  order: number;
  onGrids: number[];
}

export type Reference = Record<string, ReferenceCase>;

if (process.env.CI) throw new Error('the reference is not made anew in CI');
const path = join(import.meta.dirname, 'reference.json');
const asked = process.argv.slice(2);
for (const name of asked) {
  if (!cases.some((c) => c.name === name)) {
    throw new Error(`no case ${name}; there are ${cases.map((c) => c.name).join(', ')}`);
  }
}
const places = (value: number, digits: number) => Number(value.toFixed(digits));

for (const { name, title, shape } of cases) {
  if (asked.length > 0 && !asked.includes(name)) continue;
  const rows: ReferenceRow[] = [];
  for (const fraction of fractions) {
    const began = Date.now();
    const found = solveCase(shape, fraction * shape.travel);
    rows.push({
      fraction,
      capacitance: places(found.value, 4),
      uncertainty: places(found.uncertainty, 4),
      order: places(found.order, 2),
      onGrids: found.onGrids.map((c) => places(c, 4)),
    });
    console.log(name, JSON.stringify(rows.at(-1)), `${(Date.now() - began) / 1000} s`);
    const all: Reference = existsSync(path) ? JSON.parse(readFileSync(path, 'utf8')) : {};
    all[name] = { title, shape, rows };
    writeFileSync(path, `${JSON.stringify(all, null, 2)}\n`);
  }
}
