import { useMemo } from 'react';

/** Degrees at which numbers stand: every 30°, and the end of the travel where there is room. */
export function ruleNumbers(travel: number): number[] {
  const numbers: number[] = [];
  for (let degree = 0; degree <= travel + 1e-6; degree += 30) numbers.push(degree);
  const last = numbers.at(-1)!;
  if (travel - last > 0.05) {
    // A number needs about 13° of width on a narrow screen.
    if (travel - last < 13) numbers.pop();
    numbers.push(travel);
  }
  return numbers;
}

function ticks(travel: number, every: number, skip: readonly number[], length: number): string {
  let path = '';
  for (let degree = 0; degree <= travel + 1e-6; degree += every) {
    if (!skip.some((other) => degree % other === 0)) path += `M${degree} 0V${length}`;
  }
  return path;
}

/**
 * Ticks and numbers of the angle rule, over the whole width, with the law's span marked.
 * @param travel degrees, as is the law.
 */
export function RuleScale({
  travel,
  law,
}: {
  travel: number;
  law?: { readonly from: number; readonly to: number } | undefined;
}) {
  const paths = useMemo(
    () => ({
      ones: ticks(travel, 1, [5], 5),
      fives: ticks(travel, 5, [10], 8),
      tens: `${ticks(travel, 10, [], 13)}M${travel} 0V13`,
      numbers: ruleNumbers(travel),
    }),
    [travel],
  );
  const stroke = { fill: 'none', vectorEffect: 'non-scaling-stroke' as const };
  return (
    <div aria-hidden="true" className="pointer-events-none @container absolute inset-0">
      <svg
        viewBox={`0 0 ${travel} 14`}
        preserveAspectRatio="none"
        className="absolute top-0 left-0 h-3.5 w-full overflow-visible"
      >
        {/* Single degrees would run together on a narrow screen. */}
        <path d={paths.ones} {...stroke} className="hidden stroke-ink-2 @md:block" />
        <path d={paths.fives} {...stroke} className="stroke-ink-2" />
        <path d={paths.tens} {...stroke} className="stroke-ink" />
      </svg>
      {law && (
        <>
          <Rest from={0} to={law.from} travel={travel} />
          <Rest from={law.to} to={travel} travel={travel} />
        </>
      )}
      {paths.numbers.map((degree) => (
        <span
          key={degree}
          className="absolute top-4.5 -translate-x-1/2 text-small text-ink"
          style={{ left: `${(100 * degree) / travel}%` }}
        >
          {Number(degree.toFixed(1))}°
        </span>
      ))}
    </div>
  );
}

/** A rest before or after the law: hatched, since nothing is asked there. */
function Rest({ from, to, travel }: { from: number; to: number; travel: number }) {
  if (to - from < 1e-6) return null;
  return (
    <span
      data-part="rest"
      className="absolute top-0 h-3.5 bg-[repeating-linear-gradient(135deg,var(--color-edge)_0_1px,transparent_1px_4px)]"
      style={{ left: `${(100 * from) / travel}%`, width: `${(100 * (to - from)) / travel}%` }}
    />
  );
}
