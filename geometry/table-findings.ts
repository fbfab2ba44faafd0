/** Checks on a builder's own table once the plates stand. */

import type { LawCheck } from './derived';
import type { Design, Section } from './design';
import type { Finding } from './finding';
import { totalsOf } from './own-table';
import { formatQuantity } from './quantity';

/** Of the law's span: a table that differs by more is stretched in earnest. */
const SPAN_APART = 0.01;

/** Turns from steeper to flatter and back that a law may well have. */
const FEW_TURNS = 3;

/** Of the mean steepness: changes below this make no waves to speak of. */
const SLIGHT = 0.03;

/** How often the steepness from row to row turns from growing to falling or back. */
function turnsOf(angles: readonly number[], totals: readonly number[]): number {
  const steep = totals
    .slice(1)
    .map((total, i) => (total - totals[i]!) / (angles[i + 1]! - angles[i]!));
  const slight = (SLIGHT * (totals.at(-1)! - totals[0]!)) / (angles.at(-1)! - angles[0]!);
  let turns = 0;
  let growing: boolean | null = null;
  for (let i = 1, held = steep[0]!; i < steep.length; i++) {
    const change = steep[i]! - held;
    if (Math.abs(change) < slight) continue;
    if (growing !== null && change > 0 !== growing) turns += 1;
    growing = change > 0;
    held = steep[i]!;
  }
  return turns;
}

/** Whether its angles are those of the law, and whether its rows make a smooth blade. */
export function tableFindings(
  { travel }: Design,
  section: Section,
  index: number,
  { from, to }: Pick<LawCheck, 'from' | 'to'>,
): Finding[] {
  if (section.law !== 'points') return [];
  const degrees = (value: number): string => formatQuantity(value, 'angle', 4);
  const angles = section.lawPoints.map(([angle]) => angle);
  const rows = angles.at(-1)! - angles[0]!;
  const law = to - from;
  const stretched = Math.abs(rows - law) > SPAN_APART * law;
  const turns = turnsOf(angles, totalsOf(section));
  return [
    {
      code: 'table-span',
      severity: stretched ? 'warn' : 'ok',
      section: index,
      label: 'Angle that the rows of the table cover',
      value: rows,
      limit: law,
      quantity: 'angle',
      change: stretched
        ? `The rows are stretched to the law, which goes from ${degrees(from)} to ${degrees(to)} of the turn. For their angles as written, make the travel about ${degrees(travel + rows - law)}.`
        : '',
      parameters: ['lawPoints', 'travel', 'openRest', 'meshedRest'],
    },
    {
      code: 'table-rough',
      severity: turns > FEW_TURNS ? 'warn' : 'ok',
      section: index,
      label: 'Turns of the table between steeper and flatter',
      value: turns,
      limit: FEW_TURNS,
      quantity: 'count',
      change:
        turns > FEW_TURNS
          ? 'Each makes a wave in the blade, and the law is held less well there: take fewer rows, or values with more digits.'
          : '',
      parameters: ['lawPoints'],
    },
  ];
}
