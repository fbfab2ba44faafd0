import { toDegrees, writeDegrees } from '@/components/floor/degrees';
import { Plot } from '@/components/floor/plot';
import { roundTicks, withRoom } from '@/components/floor/ticks';
import { Figures } from '@/components/design/figures';
import { formatQuantity, sectionParameters } from '@/geometry';
import type { PlateAnswer } from './old-plate.worker';

const labelOf = (law: string): string =>
  sectionParameters.law.options.find(({ value }) => value === law)?.label ?? law;

/** The law that an old plate makes, and how near the named ones lie to it. */
export function PlateResult({ answer }: { answer: PlateAnswer }) {
  const { law, sector } = answer;
  const pico = law.capacitance.map((value) => value * 1e12);
  const range = withRoom(pico);
  return (
    <>
      <div className="relative h-36" data-part="old-law">
        <Plot
          angle={law.angle.map(toDegrees)}
          scales={[
            {
              side: 'left',
              range,
              ticks: roundTicks(...range, 4),
              write: (tick) => String(Number(tick.toPrecision(6))),
              className: 'text-ink-2',
              lines: [{ values: pico, className: 'stroke-brass-dark stroke-[2.5]' }],
            },
          ]}
        />
      </div>
      <Figures
        rows={[
          ['Blade', `${writeDegrees(sector)}° wide`],
          ['Plates alone, open', formatQuantity(law.capacitance[0]!, 'capacitance', 4)],
          ['Plates alone, meshed', formatQuantity(law.capacitance.at(-1)!, 'capacitance', 4)],
          ['Law read', `${writeDegrees(law.from)}° to ${writeDegrees(law.to)}°`],
          ...law.named.map(
            ({ law: name, deviation }) =>
              [
                `Off equal steps of ${labelOf(name)}`,
                `${Number((100 * deviation).toPrecision(2))} % of range`,
              ] as const,
          ),
        ]}
      />
    </>
  );
}
