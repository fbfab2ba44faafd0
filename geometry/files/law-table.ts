/** The law as a CSV table: what was asked, what the cut outlines give, and the difference. */

import type { SectionResult } from '../derived';
import { resonantFrequency } from '../resonance';

const PICO = 1e12;

export function lawTable(section: SectionResult): string {
  const { law, inductance, totalMin, totalMax } = section;
  const head = [
    'shaft_angle_deg',
    'target_pF',
    'achieved_pF',
    'area_only_pF',
    'error_pF',
    'error_percent_of_range',
  ];
  if (law.other) head.push('second_stator_pF');
  if (inductance !== null) head.push('target_kHz', 'achieved_kHz');
  // Outside the law there is no target: those cells stay empty.
  const cell = (value: number | null, scale: number, digits: number): string =>
    value === null ? '' : (value * scale).toFixed(digits);
  const kilohertz = (total: number | null): string =>
    total === null || inductance === null
      ? ''
      : (resonantFrequency(total, inductance) / 1e3).toFixed(3);
  const rows = law.angle.map((angle, i) => {
    const target = law.target[i]!;
    const achieved = law.achieved[i]!;
    const error = law.error[i]!;
    const row = [
      cell(angle, 180 / Math.PI, 3),
      cell(target, PICO, 4),
      cell(achieved, PICO, 4),
      cell(law.areaOnly[i]!, PICO, 4),
      cell(error, PICO, 4),
      cell(error, 100 / (totalMax - totalMin), 4),
    ];
    if (law.other) row.push(cell(law.other[i]!, PICO, 4));
    if (inductance !== null) row.push(kilohertz(target), kilohertz(achieved));
    return row.join(',');
  });
  return [head.join(','), ...rows, ''].join('\r\n');
}
