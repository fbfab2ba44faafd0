import { useId, useMemo } from 'react';
import { svgPath } from '@/components/floor/svg-path';
import type { KerfState } from '@/geometry/cutting/cut-path';
import type { Machine } from '@/geometry/cutting/machine';
import type { LaidGroup } from '@/geometry/nesting/lay-out';
import { placedContour } from '@/geometry/nesting/placed';
import { sheetCuts } from '@/geometry/nesting/sheet-cuts';

type Look = 'rotor' | 'stator' | 'other';

const lookOf = (key: string): Look =>
  key.includes('rotor') ? 'rotor' : key.includes('stator') ? 'stator' : 'other';

const strokes: Record<Look, string> = {
  rotor: 'stroke-brass-dark',
  stator: 'stroke-steel-dark',
  other: 'stroke-ink',
};

/** mm of sheet round the drawing, so that its edge is seen. */
const ROUND = 2;

/** One sheet with its parts, true shapes, holes open, and where the machine comes to each cut. */
export function SheetPreview({
  group,
  sheet,
  machine,
  kerf,
}: {
  group: LaidGroup;
  sheet: number;
  machine: Machine;
  kerf: KerfState;
}) {
  const id = useId();
  const { width, height } = group.layout.sheets[sheet]!;
  const parts = new Map(group.parts.map((part) => [part.key, part]));
  const here = group.layout.placements.filter((placement) => placement.sheet === sheet);
  const counts = group.parts
    .map(({ key, label }) => ({ label, count: here.filter((p) => p.key === key).length }))
    .filter(({ count }) => count > 0)
    .map(({ label, count }) => `${count} × ${label}`);
  const leads = useMemo(
    () =>
      sheetCuts(group, sheet, machine, kerf)
        .flatMap(({ runs }) => runs)
        .flatMap(({ leadIn }) => leadIn ?? [])
        .map(({ from, to }) => `M${from.x} ${from.y}L${to.x} ${to.y}`)
        .join(''),
    [group, sheet, machine, kerf],
  );
  // Hatching of about one line in ten pixels, whatever the sheet's size.
  const pitch = width / 90;
  const fills: Record<Look, string> = {
    rotor: 'var(--color-brass)',
    stator: `url(#${id})`,
    other: 'var(--color-panel)',
  };
  return (
    <figure className="flex flex-col gap-1">
      <svg
        viewBox={`${-ROUND} ${-height - ROUND} ${width + 2 * ROUND} ${height + 2 * ROUND}`}
        role="img"
        aria-label={`Sheet ${sheet + 1} with ${counts.join(', ')}`}
        className="max-h-96 w-full"
      >
        <defs>
          <pattern
            id={id}
            width={pitch}
            height={pitch}
            patternUnits="userSpaceOnUse"
            patternTransform="rotate(45)"
          >
            <rect width={pitch} height={pitch} fill="var(--color-white)" />
            <path d={`M0 0V${pitch}`} stroke="var(--color-steel)" strokeWidth={pitch / 2} />
          </pattern>
        </defs>
        <g transform="scale(1 -1)">
          <rect
            width={width}
            height={height}
            className="fill-well stroke-edge"
            vectorEffect="non-scaling-stroke"
          />
          {here.map((placement, index) => {
            const part = parts.get(placement.key)!;
            const look = lookOf(part.key);
            const contours = [part.outside, ...part.holes];
            return (
              <path
                key={index}
                d={svgPath(contours.map((contour) => placedContour(contour, placement)))}
                fill={fills[look]}
                fillRule="evenodd"
                className={strokes[look]}
                vectorEffect="non-scaling-stroke"
              />
            );
          })}
        </g>
        <path
          d={leads}
          transform="scale(1 -1)"
          className="fill-none stroke-action"
          vectorEffect="non-scaling-stroke"
        />
      </svg>
      <figcaption className="dense text-small text-ink-2">
        Sheet {sheet + 1} of {group.thickness} mm {group.material}, {width} by {height} mm,{' '}
        {kerf}: {counts.join(', ')}
      </figcaption>
    </figure>
  );
}
