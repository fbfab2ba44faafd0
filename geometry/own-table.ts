/** The builder's own table as a law: what its rows ask for, and what can be wrong with it. */

import type { Section } from './design';
import type { Finding } from './finding';
import { FEWEST_POINTS } from './law-points';
import { resonantCapacitance } from './resonance';

/** Why a law of one's own can't be read. */
export function unreadable(
  index: number,
  label: string,
  change: string,
  parameter: 'lawPoints' | 'lawFormula',
): Finding {
  return {
    code: 'own-law',
    severity: 'fail',
    section: index,
    label,
    value: 0,
    limit: 1,
    quantity: 'count',
    change,
    parameters: [parameter],
  };
}

/** Total capacitances of the table's rows, F; with a coil its frequencies tuned. */
export function totalsOf({ lawPoints, targetKind, inductance }: Section): number[] {
  return lawPoints.map(([, value]) =>
    targetKind === 'band' ? resonantCapacitance(value, inductance) : value,
  );
}

/** What is wrong with a section's table, if its law is one. */
export function tableFinding(section: Section, index: number): Finding | null {
  if (section.law !== 'points') return null;
  const { lawPoints, targetKind } = section;
  const label = 'Table of the law';
  if (lawPoints.length < FEWEST_POINTS) {
    const change = `Give at least ${FEWEST_POINTS} rows; there are ${lawPoints.length}.`;
    return unreadable(index, label, change, 'lawPoints');
  }
  const totals = totalsOf(section);
  const falls = totals.findIndex((total, i) => i > 0 && total <= totals[i - 1]!);
  if (falls < 0) return null;
  const change =
    targetKind === 'band'
      ? `Row ${falls + 1}: with more angle the frequency must fall. For a dial that rises, count its angles from the other end.`
      : `Row ${falls + 1}: with more angle the capacitance must rise.`;
  return unreadable(index, label, change, 'lawPoints');
}
