import { toDegrees } from '@/components/floor/degrees';
import { Plot } from '@/components/floor/plot';
import type { Derived } from '@/geometry';
import { lawPoint } from './law-point';

const short = new Intl.NumberFormat('en', {
  notation: 'compact',
  maximumSignificantDigits: 2,
});

/** Places over the law at which the line is drawn. */
const PLACES = 48;

/** The unloaded Q over the shaft angle, where the law holds. */
export function QPlot({
  derived,
  section,
  contacts,
}: {
  derived: Derived;
  section: number;
  contacts: number;
}) {
  const { law } = derived.sections[section]!;
  const points = Array.from({ length: PLACES + 1 }, (_, i) =>
    lawPoint(derived, section, i / PLACES, contacts),
  );
  const q = points.map(({ loss }) => loss.qWithContacts);
  const top = 1.05 * Math.max(...q);
  const travel = toDegrees(derived.design.travel);
  return (
    <div className="relative h-36" data-part="q">
      <Plot
        angle={[0, ...points.map(({ angle }) => toDegrees(angle)), travel]}
        scales={[
          {
            side: 'left',
            range: [0, top],
            ticks: [0, Math.max(...q)],
            write: (value) => short.format(value),
            className: 'text-ink-2',
            lines: [
              { values: [null, ...q, null], className: 'stroke-steel-dark stroke-[1.5]' },
            ],
          },
        ]}
      />
      <span className="sr-only">
        Q from {toDegrees(law.from).toFixed(0)}° to {toDegrees(law.to).toFixed(0)}°; the table
        has its values.
      </span>
    </div>
  );
}
