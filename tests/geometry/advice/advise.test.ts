import { describe, expect, test } from 'vitest';
import { createEdgeCache, defaultDesign, derive, type Design } from '../../../geometry';
import { candidateOf, variantsOf, type Candidate } from '../../../geometry/advice/advise';

const cache = createEdgeCache();

function candidates(design: Design): Candidate[] {
  return variantsOf(design, 0)
    .map((variant) => candidateOf(design, 0, variant, cache))
    .filter((candidate) => candidate !== null);
}

const wavelength = defaultDesign();
wavelength.sections[0]!.law = 'wavelength';
const wide = defaultDesign();
Object.assign(wide, { largestRadius: 110, largestDepth: 120, arrangement: 'split-stator' });
Object.assign(wide.sections[0]!, {
  law: 'capacitance',
  targetKind: 'terminals',
  minCapacitance: 20e-12,
  maxCapacitance: 150e-12,
  workingVoltage: 1500,
});

describe.each([
  ['the default design', defaultDesign()],
  ['straight-line wavelength', wavelength],
  ['split stator, high voltage', wide],
])('%s', (_name, design) => {
  const found = candidates(design);

  test('several fit, each within the room allowed', () => {
    expect(found.length).toBeGreaterThan(5);
    for (const { outerRadius, depth } of found) {
      expect(outerRadius).toBeLessThanOrEqual(design.largestRadius);
      expect(depth).toBeLessThanOrEqual(design.largestDepth);
    }
  });

  test('each holds the working voltage', () => {
    const { workingVoltage } = design.sections[0]!;
    for (const { voltage } of found) expect(voltage).toBeGreaterThanOrEqual(workingVoltage);
  });

  test('estimates against full derivation: radii within 5 %, mass within 15 %', () => {
    let derived = 0;
    for (const candidate of found.filter((_, i) => i % 5 === 0)) {
      const { airGap, rotorPlates, statorPlates } = candidate;
      const full = structuredClone(design);
      Object.assign(full.sections[0]!, { airGap, rotorPlates, statorPlates });
      const result = derive(full, { cache });
      if (!result.ok) continue;
      derived += 1;
      const { stack, sections } = result.derived;
      expect(Math.abs(candidate.sweepRadius / sections[0]!.sweepRadius - 1)).toBeLessThan(0.05);
      expect(Math.abs(candidate.outerRadius / stack.outerRadius - 1)).toBeLessThan(0.05);
      expect(Math.abs(candidate.mass / stack.mass - 1)).toBeLessThan(0.15);
    }
    expect(derived).toBeGreaterThan(1);
  });
});

test('no more than 300 variants are looked at', () => {
  expect(variantsOf(wide, 0).length).toBeLessThan(300);
});
