import type { SectionResult } from '@/geometry';
import { resonantFrequency } from '@/geometry/resonance';
import { toDegrees, toRadians } from './degrees';
import { valueAt } from './interpolate';
import type { LawSeries } from './law-series';

const EVERY = 10;

/** The chart in figures, every 10° and at the end of the travel; in the rests nothing is asked. */
export default function LawTable({
  section,
  series,
}: {
  section: SectionResult;
  series: LawSeries;
}) {
  const { law, inductance, totalMax, totalMin } = section;
  const { capacitance, frequency } = series;
  const travel = toDegrees(law.angle.at(-1)!);
  const rows: number[] = [];
  for (let degree = 0; degree < travel - 0.05; degree += EVERY) rows.push(degree);
  rows.push(travel);

  return (
    <div
      role="region"
      aria-label="The chart in figures"
      tabIndex={0}
      className="max-h-72 overflow-auto px-3 pb-3"
    >
      <table className="dense w-full max-w-2xl text-right text-small tabular-nums">
        <thead className="sticky top-0 bg-panel">
          <tr className="border-b border-line">
            {[
              'Shaft angle, °',
              `Asked, ${capacitance.unit}`,
              `Achieved, ${capacitance.unit}`,
              `Area alone, ${capacitance.unit}`,
              ...(law.other ? [`Second stator, ${capacitance.unit}`] : []),
              'Error, % of range',
              ...(frequency ? [`Tunes to, ${frequency.unit}`] : []),
            ].map((title) => (
              <th key={title} scope="col" className="py-1.5 pl-3 font-medium first:pl-0">
                {title}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((degree) => {
            const angle = toRadians(degree);
            const achieved = valueAt(law.angle, law.achieved, angle);
            const target = valueAt(law.angle, law.target, angle);
            const error = valueAt(law.angle, law.error, angle);
            return (
              <tr key={degree} className="border-b border-line/60">
                <th scope="row" className="py-1 font-normal">
                  {Number(degree.toFixed(1))}
                </th>
                <td>{target === null ? '–' : capacitance.write(target)}</td>
                <td>{capacitance.write(achieved)}</td>
                <td>{capacitance.write(valueAt(law.angle, law.areaOnly, angle))}</td>
                {law.other && (
                  <td>{capacitance.write(valueAt(law.angle, law.other, angle))}</td>
                )}
                <td>{error === null ? '–' : percent(error / (totalMax - totalMin))}</td>
                {frequency && (
                  <td>{frequency.write(resonantFrequency(achieved, inductance!))}</td>
                )}
              </tr>
            );
          })}
        </tbody>
      </table>
    </div>
  );
}

function percent(fraction: number): string {
  const size = Math.abs(100 * fraction).toFixed(3);
  if (Number(size) === 0) return size;
  return `${fraction < 0 ? '−' : '+'}${size}`;
}
