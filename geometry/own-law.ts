/** The law that a section asks for: a named one, the builder's table, a formula, or section 1's. */

import type { Section } from './design';
import type { Finding } from './finding';
import { readFormula } from './formula';
import { lawBetween, type Law } from './law';
import { monotoneCubic } from './law-points';
import { tableFinding, totalsOf, unreadable } from './own-table';
import { targetOf, type Target } from './target';
import { oscillatorCoilOf, trackedLaw } from './tracking/tracked-law';
import { followed, followsItself, nothingToFollow } from './tracking/tracked-target';

/** Looks over the law for where it doesn't rise. */
const LOOKS = 400;

/**
 * Of the rise between the first two rows and the last two: a law that is level at an end asks for
 * no plate at all there.
 */
const LEAST_AT_ENDS = 0.25;

/** Of the swept fraction; a formula is differenced over this. */
const STEP = 1e-4;

function lawOfPoints(section: Section): Law {
  const { lawPoints } = section;
  const first = lawPoints[0]![0];
  const span = lawPoints.at(-1)![0] - first;
  const cubic = monotoneCubic(
    lawPoints.map(([angle]) => (angle - first) / span),
    totalsOf(section),
    LEAST_AT_ENDS,
  );
  return { total: cubic.value, slope: cubic.slope };
}

function lawOfFormula(
  text: string,
  index: number,
  { totalMin, totalMax }: Target,
): Law | Finding {
  const label = 'Formula of the law';
  const read = readFormula(text);
  if (!read.ok)
    return unreadable(index, label, `Change the formula: ${read.message}.`, 'lawFormula');
  const { valueAt } = read;
  let before = valueAt(0);
  for (let i = 0; i <= LOOKS; i++) {
    const x = i / LOOKS;
    const value = valueAt(x);
    if (Number.isFinite(value) && (i === 0 || value > before)) {
      before = value;
      continue;
    }
    const what = Number.isFinite(value) ? 'it does not rise' : 'it gives no number';
    return unreadable(
      index,
      label,
      `At x = ${x} ${what}; it must rise from 0 to 1.`,
      'lawFormula',
    );
  }
  const from = valueAt(0);
  const scale = (totalMax - totalMin) / (valueAt(1) - from);
  const within = (x: number): number => Math.min(Math.max(x, STEP), 1 - STEP);
  return {
    total: (x) => totalMin + scale * (valueAt(x) - from),
    slope: (x) => {
      const at = within(x);
      return (scale * (valueAt(at + STEP) - valueAt(at - STEP))) / (2 * STEP);
    },
  };
}

function lawThatFollows(section: Section, index: number, first: Section): Law | Finding {
  if (index === 0) return followsItself();
  const range = targetOf(first, 0, first);
  if ('code' in range) return nothingToFollow(index);
  const signal = followed(range, index);
  if ('code' in signal) return signal;
  const law = lawOf(first, 0, range, first);
  if ('code' in law) return nothingToFollow(index);
  return trackedLaw(section, signal, law, oscillatorCoilOf(section, signal, range.stray));
}

/**
 * The law between the ends of a target, or the finding that says why there is none.
 * @param first section 1 of the same shaft, which an oscillator section follows
 */
export function lawOf(
  section: Section,
  index: number,
  target: Target,
  first: Section,
): Law | Finding {
  if (section.law === 'tracked') return lawThatFollows(section, index, first);
  if (section.law === 'points') return tableFinding(section, index) ?? lawOfPoints(section);
  if (section.law === 'formula') return lawOfFormula(section.lawFormula, index, target);
  return lawBetween(section.law, target.totalMin, target.totalMax);
}
