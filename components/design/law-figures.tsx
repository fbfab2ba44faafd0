import { formatQuantity, type SectionResult } from '@/geometry';
import { Figures } from './figures';

/** How well the finished plates hold the law, and what that figure doesn't know. */
export function LawFigures({ section }: { section: SectionResult }) {
  const { fraction, capacitance, angle } = section.law.largestError;
  return (
    <div className="flex flex-col gap-2">
      <Figures
        rows={[
          ['Largest law error', `${(fraction * 100).toPrecision(2)} % of the range`],
          ['That is', formatQuantity(capacitance, 'capacitance', 2)],
          ['At mesh angle', `${((angle * 180) / Math.PI).toFixed(1)}°`],
          ['Total, open', formatQuantity(section.totalMin, 'capacitance', 4)],
          ['Total, meshed', formatQuantity(section.totalMax, 'capacitance', 4)],
        ]}
      />
      <details className="text-small text-ink-2">
        <summary className="cursor-pointer py-1 text-ink max-bench:py-3">
          What this figure leaves out
        </summary>
        <ul className="ml-4 flex list-disc flex-col gap-1 pt-1">
          <li>
            The radial edges of the blades, which count most near the two ends of the travel.
          </li>
          <li>The two end faces of the stack, insulators, frame and posts.</li>
          <li>
            The open capacitance of the plates. It is taken as the target asks: plates and
            trimmer together must be brought to it.
          </li>
        </ul>
      </details>
    </div>
  );
}
