import { aboutZero, roundTicks } from '@/components/floor/ticks';

interface ErrorLine {
  readonly points: readonly { readonly frequency: number; readonly error: number }[];
  /** Its colour and width, as classes of a path. */
  readonly className: string;
  readonly dash?: string;
}

const HEIGHT = 100;
const WIDTH = 400;

const signed = (value: number): string =>
  value === 0 ? '0' : `${value < 0 ? '−' : '+'}${Number(Math.abs(value).toPrecision(3))}`;

/** Tracking error in kHz over the signal's frequency in kHz. */
export function ErrorPlot({ lines, label }: { lines: readonly ErrorLine[]; label: string }) {
  const all = lines.flatMap(({ points }) => points);
  const frequencies = all.map(({ frequency }) => frequency / 1e3);
  const [low, high] = [Math.min(...frequencies), Math.max(...frequencies)];
  const top = aboutZero(all.map(({ error }) => error / 1e3));
  const x = (frequency: number): number => (WIDTH * (frequency - low)) / (high - low);
  const y = (error: number): number => (HEIGHT * (1.1 * top - error)) / (2.2 * top);
  const upright = roundTicks(low, high, 6);
  const still = { fill: 'none', vectorEffect: 'non-scaling-stroke' as const };
  return (
    <div role="img" aria-label={label} className="flex flex-col gap-0.5" data-part="error">
      <div className="relative ml-13 h-36">
        <svg
          viewBox={`0 0 ${WIDTH} ${HEIGHT}`}
          preserveAspectRatio="none"
          className="absolute inset-0 h-full w-full overflow-visible"
        >
          <path
            d={[
              ...upright.map((tick) => `M${x(tick)} 0V${HEIGHT}`),
              ...[-top, 0, top].map((tick) => `M0 ${y(tick)}H${WIDTH}`),
            ].join('')}
            {...still}
            className="stroke-line"
          />
          {lines.map(({ points, className, dash }, i) => (
            <path
              key={i}
              d={points
                .map(
                  ({ frequency, error }, k) =>
                    `${k === 0 ? 'M' : 'L'}${x(frequency / 1e3).toFixed(2)} ${y(error / 1e3).toFixed(2)}`,
                )
                .join('')}
              {...still}
              strokeDasharray={dash}
              className={className}
            />
          ))}
        </svg>
        {[-top, 0, top].map((tick) => (
          <span
            key={tick}
            className="absolute right-full mr-1.5 -translate-y-1/2 text-small whitespace-nowrap text-ink-2"
            style={{ top: `${y(tick)}%` }}
          >
            {signed(tick)}
          </span>
        ))}
      </div>
      <div className="relative mr-4 ml-13 h-5 text-small text-ink-2">
        {upright.map((tick) => (
          <span
            key={tick}
            className="absolute -translate-x-1/2"
            style={{ left: `${x(tick) / (WIDTH / 100)}%` }}
          >
            {tick}
          </span>
        ))}
      </div>
      <p className="text-small text-ink-2">kHz of error over kHz of signal</p>
    </div>
  );
}
