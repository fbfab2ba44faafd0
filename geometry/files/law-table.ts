/** The law as a CSV table: what was asked, what the cut outlines give, and the difference. */

import type { SectionResult } from '../derived';
import { resonantFrequency } from '../target';

const PICO = 1e12;

export function lawTable(section: SectionResult): string {
  const { law, inductance, totalMin, totalMax } = section;
  const head = ['angle_deg', 'target_pF', 'achieved_pF', 'error_pF', 'error_percent_of_range'];
  if (inductance !== null) head.push('target_kHz', 'achieved_kHz');
  const rows = law.angle.map((angle, i) => {
    const target = law.target[i]!;
    const achieved = law.achieved[i]!;
    const error = law.error[i]!;
    const row = [
      ((angle * 180) / Math.PI).toFixed(3),
      (target * PICO).toFixed(4),
      (achieved * PICO).toFixed(4),
      (error * PICO).toFixed(4),
      ((100 * error) / (totalMax - totalMin)).toFixed(4),
    ];
    if (inductance !== null) {
      row.push(
        (resonantFrequency(target, inductance) / 1e3).toFixed(3),
        (resonantFrequency(achieved, inductance) / 1e3).toFixed(3),
      );
    }
    return row.join(',');
  });
  return [head.join(','), ...rows, ''].join('\r\n');
}
