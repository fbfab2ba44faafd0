import { expect, test } from 'vitest';
import { findingSide } from '@/components/design/finding-side';
import { defaultDesign, derive, type Design, type Finding } from '@/geometry';

function findingsOf(change: (design: Design) => void): readonly Finding[] {
  const design = defaultDesign();
  change(design);
  const derivation = derive(design);
  return derivation.ok ? derivation.derived.findings : derivation.findings;
}

function of(findings: readonly Finding[], code: Finding['code']): Finding {
  const found = findings.find((finding) => finding.code === code);
  if (!found) throw new Error(`no ${code} among ${findings.map((f) => f.code).join(', ')}`);
  return found;
}

test('what the kernel finds lies on the side of its limit that the screen names', () => {
  const designs = [
    () => undefined,
    (design: Design) => void (design.largestRadius = 30),
    (design: Design) => void (design.largestDepth = 10),
    (design: Design) => void (design.overhang = 0.1),
    (design: Design) => void (design.sections[0]!.workingVoltage = 900),
    (design: Design) => void (design.openRest = 0),
    (design: Design) => void (design.sections[0]!.stray = 40e-12),
  ];
  for (const finding of designs.flatMap(findingsOf)) {
    const { severity, value, limit, label } = finding;
    const size = Math.max(Math.abs(value), Math.abs(limit));
    // A little room: several limits are reached on purpose.
    const over = Math.abs(value - limit) < 1e-6 * size ? 0 : Math.sign(value - limit);
    const inside = { 'at most': -1, below: -1, 'at least': 1, above: 1 }[findingSide(finding)];
    expect([0, severity === 'ok' ? inside : -inside!], label).toContain(over);
  }
});

test('a law that rises to its very end rises at least that far', () => {
  const rises = of(
    findingsOf(() => undefined),
    'law-rises',
  );
  expect(rises.value).toBe(rises.limit);
  expect(findingSide(rises)).toBe('at least');
});

test('a band without width asks for a high end above the low one', () => {
  const range = of(
    findingsOf((design) => void (design.sections[0]!.bandHigh = design.sections[0]!.bandLow)),
    'range-infeasible',
  );
  expect(findingSide(range)).toBe('above');
});

test('a stray that tunes below the band asks to come below', () => {
  const range = of(
    findingsOf((design) => void (design.sections[0]!.stray = 1e-9)),
    'range-infeasible',
  );
  expect(findingSide(range)).toBe('below');
});
