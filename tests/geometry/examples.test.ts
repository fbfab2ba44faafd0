/** The worked designs that ship in public/examples: what each claims must come out of the kernel. */
import { readFileSync, readdirSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { checkDesign, derive, type Derived } from '../../geometry';

const FOLDER = new URL('../../public/examples/', import.meta.url);
const read = (file: string): unknown => JSON.parse(readFileSync(new URL(file, FOLDER), 'utf8'));

interface Entry {
  readonly file: string;
  readonly name: string;
  readonly description: string;
}

const index = read('index.json') as Entry[];

function derivedOf(file: string): Derived {
  const derivation = derive(checkDesign((read(file) as { design: unknown }).design));
  if (!derivation.ok) throw new Error(derivation.findings.map((f) => f.change).join());
  return derivation.derived;
}

test('the index names every design in the folder', () => {
  const files = readdirSync(FOLDER).filter((file) => file !== 'index.json');
  expect(index.map((entry) => entry.file).sort()).toEqual(files.sort());
});

describe.each(index)('$name', ({ file, name, description }) => {
  test('can be cut without a remark', () => {
    expect(read(file)).toMatchObject({ name, description });
    expect(derivedOf(file).findings.filter((f) => f.severity !== 'ok')).toEqual([]);
  });
});

test('the broadcast section has 300 to 400 pF of its own', () => {
  const [section] = derivedOf('broadcast-section.json').sections;
  expect(section!.ownMax * 1e12).toBeGreaterThan(300);
  expect(section!.ownMax * 1e12).toBeLessThan(400);
});

test('the panel trimmer goes from 2.6 to 14 pF with an even stator', () => {
  const [section] = derivedOf('panel-trimmer.json').sections;
  const at = (angle: number): number =>
    section!.law.achieved[section!.law.angle.indexOf(angle)]! * 1e12;
  expect(at(section!.law.from)).toBeCloseTo(2.6, 2);
  expect(at(section!.law.to)).toBeCloseTo(14, 2);
  expect(section!.statorForm).toBe('even');
  expect(section!.sweepRadius).toBeLessThan(10);
});

test('the laboratory section holds its law within 0.5 pF', () => {
  const [section] = derivedOf('laboratory-section.json').sections;
  const worst = Math.max(...section!.law.error.map((e) => Math.abs(e ?? 0)));
  expect(worst * 1e12).toBeLessThan(0.5);
});
