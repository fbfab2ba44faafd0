import { toDegrees } from '@/components/floor/degrees';
import { Plot } from '@/components/floor/plot';
import { aboutZero } from '@/components/floor/ticks';
import type { Band } from '@/geometry/tolerance/stacks';

const signed = (value: number): string =>
  value === 0 ? '0' : `${value < 0 ? '−' : '+'}${Number(Math.abs(value).toPrecision(2))}`;

/** Within what band nine of ten stacks lie about the law, percent of the range over the angle. */
export function BandPlot({ band, range }: { band: Band; range: number }) {
  const percent = (values: readonly number[]): number[] =>
    values.map((value) => (100 * value) / range);
  const [low, middle, high] = [band.low, band.middle, band.high].map(percent) as [
    number[],
    number[],
    number[],
  ];
  const top = aboutZero([...low, ...high]);
  return (
    <div className="relative h-36" data-part="band">
      <Plot
        angle={band.angle.map(toDegrees)}
        scales={[
          {
            side: 'left',
            range: [-1.1 * top, 1.1 * top],
            ticks: [-top, 0, top],
            write: signed,
            className: 'text-ink-2',
            lines: [
              { values: low, className: 'stroke-steel-dark stroke-[1.5]' },
              { values: high, className: 'stroke-steel-dark stroke-[1.5]' },
              { values: middle, className: 'stroke-brass-dark stroke-2', dash: '5 3' },
            ],
          },
        ]}
      />
    </div>
  );
}
