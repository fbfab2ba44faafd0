import { svgPath } from '@/components/floor/svg-path';
import type { SectionResult } from '@/geometry';

const RAYS = Array.from({ length: 24 }, (_, index) => index * 15);

/** The plates of a section scribed on the floor, to look at. Decorative. */
export function ScribedPlates({
  section,
  reach,
  turn,
}: {
  section: SectionResult;
  /** Radius shown, mm. */
  reach: number;
  /** Shaft angle, degrees. */
  turn: number;
}) {
  const { rotor, stator } = section;
  const rings = Array.from({ length: Math.floor(reach / 10) }, (_, index) => 10 * (index + 1));
  return (
    <svg
      viewBox={`${-reach} ${-reach} ${2 * reach} ${2 * reach}`}
      aria-hidden="true"
      className="size-full max-h-160 *:[vector-effect:non-scaling-stroke]"
    >
      <defs>
        <pattern
          id="scribed-hatch"
          width="2"
          height="2"
          patternUnits="userSpaceOnUse"
          patternTransform="rotate(45)"
        >
          <path d="M0 0V2" className="stroke-steel/60" strokeWidth="0.3" />
        </pattern>
      </defs>
      <g className="fill-none stroke-scribe/25" strokeWidth="0.25">
        {rings.map((radius) => (
          <circle key={radius} r={radius} />
        ))}
        {RAYS.map((angle) => (
          <path key={angle} d={`M10 0H${reach}`} transform={`rotate(${angle})`} />
        ))}
      </g>
      <g transform="scale(1 -1)" fillRule="evenodd" strokeWidth="0.5">
        <path
          d={svgPath([stator.outside, ...stator.holes])}
          fill="url(#scribed-hatch)"
          className="stroke-steel"
        />
        <path
          d={svgPath([rotor.outside, ...rotor.holes])}
          transform={`rotate(${turn})`}
          className="fill-brass/60 stroke-brass"
        />
      </g>
    </svg>
  );
}
