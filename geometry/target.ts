import type { Section } from './design';
import type { Finding } from './finding';

/** What a section must reach, F and H. */
export interface Target {
  readonly totalMin: number;
  readonly totalMax: number;
  readonly stray: number;
  readonly inductance: number | null;
}

/**
 * Capacitance that tunes a coil to a frequency: C = 1/((2πf)²·L).
 * @param frequency Hz
 * @param inductance H
 * @returns F
 */
export function resonantCapacitance(frequency: number, inductance: number): number {
  return 1 / ((2 * Math.PI * frequency) ** 2 * inductance);
}

/**
 * Frequency to which a capacitance tunes a coil.
 * @param capacitance F, the total
 * @param inductance H
 * @returns Hz
 */
export function resonantFrequency(capacitance: number, inductance: number): number {
  return 1 / (2 * Math.PI * Math.sqrt(capacitance * inductance));
}

function infeasible(
  index: number,
  rest: Pick<Finding, 'label' | 'value' | 'limit' | 'quantity' | 'change' | 'parameters'>,
): Finding {
  return { code: 'range-infeasible', severity: 'fail', section: index, ...rest };
}

/** The total range of a section, or the finding that says why there is none. */
export function targetOf(section: Section, index: number): Target | Finding {
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
  if (stray >= totalMin) {
    return infeasible(index, {
      label: 'Circuit stray below the total at the high end',
      value: stray,
      limit: totalMin,
      quantity: 'capacitance',
      change:
        'The stray alone tunes below the high end: lower it, take a smaller coil or a lower high end.',
      parameters: ['stray', 'inductance', 'bandHigh'],
    });
  }
  return { totalMin, totalMax, stray, inductance };
}
