/** The worked pair goes through files and bill like a single section. */
import { readFileSync } from 'node:fs';
import { expect, it } from 'vitest';
import { checkDesign, derive } from '../../../geometry';
import { cutFiles } from '../../../geometry/files';

it('has plates, a law and places in the bill for either section', () => {
  const url = new URL('../../../public/examples/tracked-pair.json', import.meta.url);
  const { design } = JSON.parse(readFileSync(url, 'utf8')) as { design: unknown };
  const result = derive(checkDesign(design), { model: 'edges' });
  if (!result.ok) throw new Error(result.findings.map(({ change }) => change).join());
  const files = cutFiles('Bench pair', result.derived);
  const names = files.map(({ name }) => name);
  for (const section of ['s1', 's2']) {
    for (const what of [`_${section}-rotor_`, `_${section}-stator_`, `_${section}-law.csv`]) {
      expect(names.some((name) => name.includes(what))).toBe(true);
    }
  }
  const bill = files.find(({ name }) => name.endsWith('_parts.csv'))!.text;
  expect(bill).toContain('section 1');
  expect(bill).toContain('section 2');
  const law = files.find(({ name }) => name.endsWith('_s2-law.csv'))!.text.split('\r\n');
  const column = law[0]!.split(',').indexOf('target_kHz');
  const targets = law.slice(1).flatMap((row) => Number(row.split(',')[column]) || []);
  expect(Math.max(...targets)).toBeCloseTo(1700 + 455, 2);
  expect(Math.min(...targets)).toBeCloseTo(530 + 455, 2);
});
