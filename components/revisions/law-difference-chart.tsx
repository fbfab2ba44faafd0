import type { ReactNode } from 'react';
import { valueAt } from '@/components/floor/interpolate';
import { Plot } from '@/components/floor/plot';
import { aboutZero, roundTicks, withRoom } from '@/components/floor/ticks';
import type { LawDifference } from './law-difference';
import { PairTable } from './pair-table';

const EVERY = 10;

function signed(value: number): string {
  const number = String(Number(Math.abs(value).toPrecision(3)));
  if (Number(number) === 0) return '0';
  return value < 0 ? `−${number}` : `+${number}`;
}

function Strip({
  title,
  tall,
  children,
}: {
  title: string;
  tall: boolean;
  children: ReactNode;
}) {
  return (
    <div aria-hidden="true" className="relative flow-root border-t border-line">
      <div className={`relative mt-6 mb-1.5 ${tall ? 'h-32' : 'h-20'}`}>{children}</div>
      <span className="absolute top-1 left-2 text-small text-ink-2">{title}</span>
    </div>
  );
}

/** A line about zero, with as much room above as below. */
function Difference({
  angle,
  values,
}: {
  angle: readonly number[];
  values: readonly number[];
}) {
  const top = aboutZero(values);
  return (
    <Plot
      angle={angle}
      scales={[
        {
          side: 'left',
          range: [-1.2 * top, 1.2 * top],
          ticks: [-top, 0, top],
          write: signed,
          className: 'text-ink-2',
          lines: [{ values, className: 'stroke-bad stroke-[1.5]' }],
        },
      ]}
    />
  );
}

function rowsOf({ angle, first, second, difference, percent }: LawDifference): string[][] {
  const end = angle.at(-1)!;
  const degrees: number[] = [];
  for (let degree = 0; degree < end - 0.05; degree += EVERY) degrees.push(degree);
  degrees.push(end);
  const at = (values: readonly number[], degree: number) => valueAt(angle, values, degree);
  return degrees.map((degree) => [
    `${Number(degree.toFixed(1))}°`,
    at(first, degree).toPrecision(5),
    at(second, degree).toPrecision(5),
    signed(at(difference, degree)),
    signed(at(percent, degree)),
  ]);
}

/** What the second state has more or less than the first over the shaft angle. */
export function LawDifferenceChart({
  series,
  titles: [first, second],
}: {
  series: LawDifference;
  titles: readonly [string, string];
}) {
  const { angle, unit } = series;
  const range = withRoom([...series.first, ...series.second]);
  return (
    <section aria-label="Difference of the laws" className="bg-panel">
      <Strip title={`total, ${unit.unit}`} tall>
        <Plot
          angle={angle}
          scales={[
            {
              side: 'left',
              range,
              ticks: roundTicks(...range, 5),
              write: (value) => String(Number(value.toPrecision(6))),
              className: 'text-ink-2',
              lines: [
                { values: series.first, className: 'stroke-brass-dark stroke-[2.5]' },
                { values: series.second, className: 'stroke-action stroke-2', dash: '7 4' },
              ],
            },
          ]}
        />
      </Strip>
      <Strip title="second less first, pF" tall={false}>
        <Difference angle={angle} values={series.difference} />
      </Strip>
      <Strip title="the same, % of the first there" tall={false}>
        <Difference angle={angle} values={series.percent} />
      </Strip>
      <ul className="flex flex-wrap gap-x-5 gap-y-1 px-3 py-2 text-small">
        <li className="flex items-center gap-2 font-semibold text-brass-dark">
          <svg width="26" height="8" viewBox="0 0 26 8" aria-hidden="true">
            <path d="M0 4H26" strokeWidth="2.5" className="stroke-brass-dark" />
          </svg>
          {first}
        </li>
        <li className="flex items-center gap-2 font-semibold text-action">
          <svg width="26" height="8" viewBox="0 0 26 8" aria-hidden="true">
            <path d="M0 4H26" strokeWidth="2" strokeDasharray="7 4" className="stroke-action" />
          </svg>
          {second}
        </li>
      </ul>
      <details className="border-t border-line">
        <summary className="cursor-pointer px-3 py-2.5 text-small font-medium max-bench:py-3.5">
          The chart in figures, every 10°
        </summary>
        <PairTable
          caption="Difference of the laws in figures"
          titles={[
            'Shaft angle',
            `${first}, ${unit.unit}`,
            `${second}, ${unit.unit}`,
            'Difference, pF',
            'Difference, %',
          ]}
          rows={rowsOf(series)}
          none=""
        />
      </details>
    </section>
  );
}
