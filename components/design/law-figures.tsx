import { formatQuantity, type LawError, type SectionResult } from '@/geometry';
import { Figures } from './figures';

const degrees = (angle: number): string => `${((angle * 180) / Math.PI).toFixed(1)}°`;
const share = ({ fraction }: LawError): string =>
  `${Number((fraction * 100).toPrecision(2))} %`;

/** How well the finished plates hold the law, and what that figure doesn't know. */
export function LawFigures({ section }: { section: SectionResult }) {
  const { law, model, totalMin, totalMax } = section;
  return (
    <div className="flex flex-col gap-2">
      <p className="text-small text-ink-2">
        {model === 'field'
          ? 'With edges and plan view.'
          : 'With the edges alone; the plan view is being solved.'}
      </p>
      <Figures
        rows={[
          ['Largest error, 5 to 95 %', `${share(law.largestInner)} of the range`],
          [
            'That is',
            `${formatQuantity(law.largestInner.capacitance, 'capacitance', 2)} at ${degrees(law.largestInner.angle)}`,
          ],
          [
            'Over the whole law',
            `${share(law.largestError)} at ${degrees(law.largestError.angle)}`,
          ],
          ['Counted from', section.terminals],
          ['Law begins and ends', `${degrees(law.from)} to ${degrees(law.to)}`],
          ['Total where it begins', formatQuantity(totalMin, 'capacitance', 4)],
          ['Total where it ends', formatQuantity(totalMax, 'capacitance', 4)],
        ]}
      />
      <details className="text-small text-ink-2">
        <summary className="cursor-pointer py-1 text-ink max-bench:py-3">
          What these figures leave out
        </summary>
        <ul className="ml-4 flex list-disc flex-col gap-1 pt-1">
          <li>
            What stands near the end faces of the stack: frame plates, a neighbouring section,
            the shaft beyond the plates. The open end faces themselves are counted.
          </li>
          <li>
            Insulators and frame beyond the allowance, which is yours to set and to measure.
          </li>
          {section.statorAngles.length > 1 && (
            <li>What the two stators have directly to each other past the rotor.</li>
          )}
          {section.electricalGap !== section.airGap && (
            <li>At the edges a film or disc is counted by the gap it stands for.</li>
          )}
          <li>What sheet, cutting and assembly add by their tolerances.</li>
        </ul>
      </details>
    </div>
  );
}
