import { svgPath } from '@/components/floor/svg-path';
import { contourBounds } from '@/geometry/measure';
import type { CutPart } from '@/geometry/parts/part';

/** A cut part as it will be cut, holes open; not to scale with its neighbours. */
export function PartPicture({ part }: { part: CutPart }) {
  const { minX, minY, maxX, maxY } = contourBounds(part.outside);
  const size = Math.max(maxX - minX, maxY - minY) * 1.06;
  const x = (minX + maxX - size) / 2;
  const y = (-minY - maxY - size) / 2;
  return (
    <svg
      viewBox={`${x} ${y} ${size} ${size}`}
      role="img"
      aria-label={`Outline of ${part.label}`}
      className="size-16 shrink-0 max-wide:size-24"
    >
      <g transform="scale(1 -1)">
        <path
          d={svgPath([part.outside, ...part.holes])}
          fillRule="evenodd"
          className="fill-well stroke-ink"
          strokeWidth="1.25"
          vectorEffect="non-scaling-stroke"
        />
      </g>
    </svg>
  );
}
