import type { SectionResult } from '@/geometry';
import { formatQuantity } from '@/geometry/quantity';
import { writeDegrees } from './degrees';
import type { LawSeries } from './law-series';

function Sample({ className, dash }: { className: string; dash?: string }) {
  return (
    <svg width="22" height="8" viewBox="0 0 22 8" aria-hidden="true" className="shrink-0">
      <path d="M0 4H22" strokeWidth="2.5" strokeDasharray={dash} className={className} />
    </svg>
  );
}

/** What the lines are, over which range, and the largest law error with its place. */
export function LawLegend({ section, series }: { section: SectionResult; series: LawSeries }) {
  const { capacitance, frequency, other, tuned } = series;
  const { largestInner, largestError, achieved } = section.law;
  return (
    <ul className="flex flex-wrap items-center gap-x-5 gap-y-1 px-3 py-2 text-small text-ink-2">
      <li className="flex items-center gap-2">
        <Sample className="stroke-brass-dark" />
        <span>
          <strong className="font-semibold text-brass-dark">Capacitance achieved</strong>{' '}
          {capacitance.write(achieved[0]!)} to {capacitance.write(achieved.at(-1)!)}{' '}
          {capacitance.unit}
        </span>
      </li>
      {other && (
        <li className="flex items-center gap-2">
          <Sample className="stroke-steel-dark" />
          <span>to the second stator</span>
        </li>
      )}
      <li className="flex items-center gap-2">
        <Sample className="stroke-ink" dash="2 4" />
        <span>asked by the law</span>
      </li>
      <li className="flex items-center gap-2">
        <Sample className="stroke-steel-dark" dash="6 3" />
        <span>area alone, for comparison</span>
      </li>
      {frequency && tuned && (
        <li className="flex items-center gap-2">
          <Sample className="stroke-action" />
          <span>
            <strong className="font-semibold text-action">Frequency</strong>{' '}
            {Math.round(tuned[0]! * 1000) / 1000 >= 100
              ? `${Math.round(tuned[0]!)} to ${Math.round(tuned.at(-1)!)}`
              : `${tuned[0]!.toPrecision(4)} to ${tuned.at(-1)!.toPrecision(4)}`}{' '}
            {frequency.unit}
          </span>
        </li>
      )}
      <li className="flex items-center gap-2 wide:ml-auto">
        <Sample className="stroke-bad" />
        <span>
          largest law error between 5 and 95 %{' '}
          <strong className="font-semibold text-ink">
            {Number((100 * largestInner.fraction).toPrecision(2))} % of range
          </strong>{' '}
          ({formatQuantity(Math.abs(largestInner.capacitance), 'capacitance', 2)}) at{' '}
          {writeDegrees(largestInner.angle)}°; over the whole law{' '}
          {Number((100 * largestError.fraction).toPrecision(2))} % at{' '}
          {writeDegrees(largestError.angle)}°
        </span>
      </li>
    </ul>
  );
}
