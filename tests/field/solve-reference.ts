/**
 * Writes tests/field/reference.json, case by case as each is done:
 *   npx tsx tests/field/solve-reference.ts [case …]
 * Grids cut 1, 2 and 3 times; REFINEMENTS=2,3,4 before the command asks for finer ones. Hours of
 * computing for all of it, so the results are kept, and never made anew in CI.
 */
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { cases, fractions } from './cases';
import { solveCase } from './solve-case';
import type { Reference, ReferenceRow } from './reference';
import type { Refinements } from './extrapolation';

if (process.env.CI) throw new Error('the reference is not made anew in CI');
const path = join(import.meta.dirname, 'reference.json');
const asked = process.argv.slice(2);
for (const name of asked) {
  if (!cases.some((c) => c.name === name)) {
    throw new Error(`no case ${name}; there are ${cases.map((c) => c.name).join(', ')}`);
  }
}
const [coarse = NaN, middle = NaN, fine = NaN] = (process.env.REFINEMENTS ?? '1,2,3')
  .split(',')
  .map(Number);
const refinements: Refinements = [coarse, middle, fine];
if (!(coarse >= 1 && middle > coarse && fine > middle)) {
  throw new Error(`refinements ${refinements.join(',')}: three rising whole numbers`);
}
const places = (value: number, digits: number) => Number(value.toFixed(digits));

for (const { name, title, shape } of cases) {
  if (asked.length > 0 && !asked.includes(name)) continue;
  const rows: ReferenceRow[] = [];
  for (const fraction of fractions) {
    const began = Date.now();
    const found = solveCase(shape, fraction * shape.travel, refinements);
    rows.push({
      fraction,
      capacitance: places(found.value, 4),
      uncertainty: places(found.uncertainty, 4),
      order: places(found.order, 2),
      onGrids: found.onGrids.map((c) => places(c, 4)),
    });
    console.log(name, JSON.stringify(rows.at(-1)), `${(Date.now() - began) / 1000} s`);
    const all: Reference = existsSync(path) ? JSON.parse(readFileSync(path, 'utf8')) : {};
    all[name] = { title, shape, refinements, rows };
    writeFileSync(path, `${JSON.stringify(all, null, 2)}\n`);
  }
}
