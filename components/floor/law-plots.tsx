import type { LawSeries } from './law-series';
import { Plot, type PlotScale } from './plot';
import { aboutZero, roundTicks, withRoom } from './ticks';

const plain = (value: number): string => String(Number(value.toPrecision(6)));

function signed(value: number): string {
  const number = String(Number(Math.abs(value).toPrecision(2)));
  if (Number(number) === 0) return '0';
  return value < 0 ? `−${number}` : `+${number}`;
}

/** Capacitance asked, achieved and of the area alone, with the frequency when there is a coil. */
export function LawPlot({ series }: { series: LawSeries }) {
  const { angle, achieved, areaOnly, other, target, tuned } = series;
  const range = withRoom([...achieved, ...areaOnly, ...(other ?? [])]);
  const scales: PlotScale[] = [
    {
      side: 'left',
      range,
      ticks: roundTicks(...range, 5),
      write: plain,
      className: 'text-ink-2',
      lines: [
        { values: areaOnly, className: 'stroke-steel-dark stroke-1', dash: '6 3' },
        ...(other ? [{ values: other, className: 'stroke-steel-dark stroke-2' }] : []),
        { values: achieved, className: 'stroke-brass-dark stroke-[2.5]' },
        { values: target, className: 'stroke-ink stroke-[1.5]', dash: '2 5' },
      ],
    },
  ];
  if (tuned) {
    const band = withRoom(tuned);
    scales.push({
      side: 'right',
      range: band,
      ticks: roundTicks(...band, 5),
      write: plain,
      className: 'text-action',
      lines: [{ values: tuned, className: 'stroke-action stroke-2' }],
    });
  }
  return <Plot angle={angle} scales={scales} />;
}

/** The law error in a strip of its own, with its largest value ringed. */
export function ErrorPlot({ series }: { series: LawSeries }) {
  const top = aboutZero(series.error);
  const { angle, error } = series.largest;
  return (
    <Plot
      angle={series.angle}
      mark={{ angle, value: error }}
      scales={[
        {
          side: 'left',
          range: [-1.2 * top, 1.2 * top],
          ticks: [-top, 0, top],
          write: signed,
          className: 'text-ink-2',
          lines: [{ values: series.error, className: 'stroke-bad stroke-[1.5]' }],
        },
      ]}
    />
  );
}
