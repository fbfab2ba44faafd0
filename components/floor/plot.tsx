import { INSET_LEFT, INSET_RIGHT } from './insets';

/** One line over the travel; null is a gap in it. */
export interface PlotLine {
  readonly values: readonly (number | null)[];
  /** Its colour and width, as classes of a path. */
  readonly className: string;
  readonly dash?: string;
}

export interface PlotScale {
  readonly side: 'left' | 'right';
  readonly range: readonly [number, number];
  readonly ticks: readonly number[];
  readonly write: (tick: number) => string;
  readonly className: string;
  readonly lines: readonly PlotLine[];
}

/** Height of the drawing in its own units; it is stretched to its place. */
const HEIGHT = 100;

/** Share of the height, from the top, at which a value stands. */
export function heightOf(value: number, [low, high]: PlotScale['range']): number {
  return 1 - (value - low) / (high - low);
}

/** The path of a line through its samples. */
export function linePath(
  angle: readonly number[],
  { values }: Pick<PlotLine, 'values'>,
  range: PlotScale['range'],
): string {
  let path = '';
  let drawing = false;
  values.forEach((value, i) => {
    if (value === null) {
      drawing = false;
      return;
    }
    const y = (HEIGHT * heightOf(value, range)).toFixed(3);
    path += `${drawing ? 'L' : 'M'}${angle[i]!.toFixed(3)} ${y}`;
    drawing = true;
  });
  return path;
}

/**
 * Lines over the travel, as wide as the angle rule above, which is the scale of their angles. The
 * first scale rules the lines across.
 */
export function Plot({
  angle,
  scales,
  mark,
}: {
  /** Degrees, from 0 to the travel. */
  angle: readonly number[];
  scales: readonly PlotScale[];
  /** A place to ring, on the first scale. */
  mark?: { readonly angle: number; readonly value: number };
}) {
  const travel = angle.at(-1)!;
  const still = { fill: 'none', vectorEffect: 'non-scaling-stroke' as const };
  const first = scales[0]!;
  const upright = Array.from(
    { length: Math.floor(travel / 30 + 1e-6) + 1 },
    (_, i) => `M${30 * i} 0V${HEIGHT}`,
  );
  const across = first.ticks.map(
    (tick) => `M0 ${HEIGHT * heightOf(tick, first.range)}H${travel}`,
  );
  return (
    <>
      <div
        className="absolute inset-y-0"
        style={{ left: INSET_LEFT, right: INSET_RIGHT }}
        data-part="plot"
      >
        <svg
          viewBox={`0 0 ${travel} ${HEIGHT}`}
          preserveAspectRatio="none"
          className="absolute inset-0 h-full w-full overflow-visible"
        >
          <path d={[...upright, ...across].join('')} {...still} className="stroke-line" />
          {scales.flatMap(({ lines, range }, s) =>
            lines.map((line, i) => (
              <path
                key={`${s} ${i}`}
                d={linePath(angle, line, range)}
                {...still}
                strokeDasharray={line.dash}
                strokeLinejoin="round"
                className={line.className}
              />
            )),
          )}
        </svg>
        {mark && (
          <span
            className="absolute size-2.5 -translate-1/2 rounded-full border-[1.5px] border-ink"
            style={{
              left: `${(100 * mark.angle) / travel}%`,
              top: `${100 * heightOf(mark.value, first.range)}%`,
            }}
          />
        )}
      </div>
      {scales.map(({ side, ticks, range, write, className }) =>
        ticks.map((tick) => (
          <span
            key={`${side} ${tick}`}
            className={`absolute -translate-y-1/2 text-small ${className}`}
            style={{
              top: `${100 * heightOf(tick, range)}%`,
              ...(side === 'left'
                ? { right: `calc(100% - ${INSET_LEFT - 6}px)` }
                : { left: `calc(100% - ${INSET_RIGHT - 6}px)` }),
            }}
          >
            {write(tick)}
          </span>
        )),
      )}
    </>
  );
}
