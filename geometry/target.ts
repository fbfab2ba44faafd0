import type { Section } from './design';
import type { Finding } from './finding';
import { tableFinding, totalsOf } from './own-table';
import { resonantCapacitance } from './resonance';
import {
  followed,
  followsItself,
  nothingToFollow,
  trackedTarget,
} from './tracking/tracked-target';

/** What a section must reach, F and H. */
export interface Target {
  readonly totalMin: number;
  readonly totalMax: number;
  readonly stray: number;
  readonly inductance: number | null;
}

function infeasible(
  index: number,
  rest: Pick<Finding, 'label' | 'value' | 'limit' | 'quantity' | 'change' | 'parameters'>,
): Finding {
  return { code: 'range-infeasible', severity: 'fail', section: index, ...rest };
}

function strayFinding(
  { law }: Section,
  index: number,
  stray: number,
  totalMin: number,
): Finding {
  return infeasible(index, {
    label: 'Circuit stray below the total at the high end',
    value: stray,
    limit: totalMin,
    quantity: 'capacitance',
    change:
      'The stray alone tunes below the high end: lower it, take a smaller coil or a lower high end.',
    parameters: ['stray', 'inductance', law === 'points' ? 'lawPoints' : 'bandHigh'],
  });
}

function targetOfTable(section: Section, index: number): Target | Finding {
  const wrong = tableFinding(section, index);
  if (wrong) return wrong;
  const totals = totalsOf(section);
  const ends = { totalMin: totals[0]!, totalMax: totals.at(-1)! };
  if (section.targetKind === 'terminals') return { ...ends, stray: 0, inductance: null };
  const { stray, inductance } = section;
  if (stray < ends.totalMin) return { ...ends, stray, inductance };
  return strayFinding(section, index, stray, ends.totalMin);
}

/**
 * The total range of a section, or the finding that says why there is none.
 * @param first section 1 of the same shaft, which an oscillator section follows
 */
export function targetOf(section: Section, index: number, first: Section): Target | Finding {
  if (section.law === 'tracked') {
    if (index === 0) return followsItself();
    const range = targetOf(first, 0, first);
    if ('code' in range) return nothingToFollow(index);
    const signal = followed(range, index);
    if ('code' in signal) return signal;
    return trackedTarget(section, index, signal, range.stray);
  }
  if (section.law === 'points') return targetOfTable(section, index);
  if (section.targetKind === 'terminals') {
    const { minCapacitance: min, maxCapacitance: max } = section;
    if (min < max) return { totalMin: min, totalMax: max, stray: 0, inductance: null };
    return infeasible(index, {
      label: 'Meshed capacitance above open',
      value: max,
      limit: min,
      quantity: 'capacitance',
      change: 'Give a meshed capacitance larger than the open one.',
      parameters: ['maxCapacitance', 'minCapacitance'],
    });
  }
  const { bandLow, bandHigh, inductance, stray } = section;
  if (bandLow >= bandHigh) {
    return infeasible(index, {
      label: 'High end of the band above its low end',
      value: bandHigh,
      limit: bandLow,
      quantity: 'frequency',
      change: 'Give a high end above the low end.',
      parameters: ['bandHigh', 'bandLow'],
    });
  }
  const totalMin = resonantCapacitance(bandHigh, inductance);
  const totalMax = resonantCapacitance(bandLow, inductance);
  if (stray >= totalMin) return strayFinding(section, index, stray, totalMin);
  return { totalMin, totalMax, stray, inductance };
}
