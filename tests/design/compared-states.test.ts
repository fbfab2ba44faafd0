/** What a comparison of two states says. */

import { describe, expect, it } from 'vitest';
import { figurePairs } from '@/components/revisions/figures-of';
import { lawDifference } from '@/components/revisions/law-difference';
import { defaultDesign, derive, type Derived, type SectionResult } from '@/geometry';

function plates(airGap: number): Derived {
  const design = defaultDesign();
  const sections = design.sections.map((section) => ({ ...section, airGap }));
  const derivation = derive({ ...design, sections }, { model: 'edges' });
  if (!derivation.ok) throw new Error('no plates');
  return derivation.derived;
}

const narrow = plates(0.5);
const wide = plates(0.62);
const section = narrow.sections[0]!;

/** The same law with every second sample alone. */
function thinned(of: SectionResult): SectionResult {
  const { angle, achieved } = of.law;
  const kept = angle.map((_, i) => i % 2 === 0 || i === angle.length - 1);
  const law = {
    ...of.law,
    angle: angle.filter((_, i) => kept[i]),
    achieved: achieved.filter((_, i) => kept[i]),
  };
  return { ...of, law };
}

describe('the difference of two laws', () => {
  it('is nothing where both are the same', () => {
    const { difference, percent } = lawDifference(section, section);
    expect(difference.every((value) => value === 0)).toBe(true);
    expect(percent.every((value) => value === 0)).toBe(true);
  });

  it('is the second less the first, in pF and of the first', () => {
    const two = {
      ...section,
      law: { ...section.law, achieved: section.law.achieved.map((total) => 1.02 * total) },
    };
    const { difference, percent } = lawDifference(section, two);
    difference.forEach((value, i) => {
      expect(value).toBeCloseTo(0.02 * section.law.achieved[i]! * 1e12, 9);
      expect(percent[i]).toBeCloseTo(2, 9);
    });
  });

  it('shows next to nothing of where a law was sampled', () => {
    const { difference, angle } = lawDifference(section, thinned(section));
    const range = (section.totalMax - section.totalMin) * 1e12;
    // Not across the kinks at both ends of the law.
    const inner = difference.filter((_, i) => angle[i]! > 20 && angle[i]! < 170);
    expect(inner.length).toBeGreaterThan(20);
    expect(Math.max(...inner.map(Math.abs)) / range).toBeLessThan(2e-4);
  });
});

describe('figures beside each other', () => {
  it('are all the same for one state', () => {
    expect(figurePairs(narrow, narrow).filter(({ same }) => !same)).toEqual([]);
  });

  it('name what a wider gap changes, with sign and share', () => {
    const changed = figurePairs(narrow, wide).filter(({ same }) => !same);
    const gap = changed.find(({ label }) => label === 'Air gap')!;
    expect(gap).toMatchObject({ a: '0.5 mm', b: '0.62 mm', change: '+0.12 mm (+24 %)' });
    const back = figurePairs(wide, narrow).find(({ label }) => label === 'Air gap')!;
    expect(back.change).toBe('−0.12 mm (−19.4 %)');
  });
});
