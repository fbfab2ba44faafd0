import type { SectionResult } from '@/geometry';
import { toDegrees } from './degrees';
import { svgPath } from './svg-path';
import type { useRotorDrag } from './use-rotor-drag';

/** Stators of a section, hatched with a steel edge, its posts with them. Drawn with y up. */
export function StatorPlate({
  section,
  hatch,
}: {
  section: SectionResult;
  /** Id of the hatch pattern. */
  hatch: string;
}) {
  const { stator, statorAngles, posts } = section;
  const path = svgPath([stator.outside, ...stator.holes]);
  return (
    <g data-part="stator">
      {statorAngles.map((angle) => (
        <path
          key={angle}
          d={path}
          transform={`rotate(${toDegrees(angle)})`}
          fillRule="evenodd"
          fill={`url(#${hatch})`}
          className="stroke-steel"
          strokeWidth="1.75"
          vectorEffect="non-scaling-stroke"
        />
      ))}
      {posts.map((post) => (
        <circle
          key={`${post.x} ${post.y}`}
          cx={post.x}
          cy={post.y}
          r={post.spacerRadius}
          className="fill-none stroke-steel/70"
          strokeDasharray="2 3"
          vectorEffect="non-scaling-stroke"
        />
      ))}
    </g>
  );
}

/** Rotor of a section, solid with a brass edge, and the shaft; drawn at mesh angle 0, y up. */
export function RotorPlate({
  section,
  shaftRadius,
  mark,
  drag,
}: {
  section: SectionResult;
  /** mm. */
  shaftRadius: number;
  /** Radius at which the leading edge is marked, mm. */
  mark: number;
  drag: ReturnType<typeof useRotorDrag>;
}) {
  const path = svgPath([section.rotor.outside, ...section.rotor.holes]);
  return (
    <g className="pointer-events-auto cursor-grab touch-none active:cursor-grabbing" {...drag}>
      <path
        d={path}
        fillRule="evenodd"
        className="fill-brass/65 stroke-brass"
        strokeWidth="2"
        strokeLinejoin="round"
        vectorEffect="non-scaling-stroke"
      />
      {/* A margin for fingers: the blade is narrow at its leading end. */}
      <path
        d={path}
        fill="none"
        stroke="transparent"
        strokeWidth="28"
        pointerEvents="stroke"
        vectorEffect="non-scaling-stroke"
      />
      <circle
        r={shaftRadius}
        className="fill-floor-edge stroke-brass"
        strokeWidth="1.5"
        vectorEffect="non-scaling-stroke"
      />
      <path
        d={`M0 0H${shaftRadius * 0.8}M${section.sweepRadius} 0H${mark}`}
        className="stroke-brass"
        strokeDasharray="5 4"
        vectorEffect="non-scaling-stroke"
      />
    </g>
  );
}

/** One plate of the sections that are not picked, as lines over those of the one that is. */
export function OtherPlates({
  sections,
  role,
}: {
  sections: readonly SectionResult[];
  role: 'rotor' | 'stator';
}) {
  return (
    <g data-part={`other-${role}s`} className="pointer-events-none">
      {sections.flatMap((section, i) =>
        (role === 'rotor' ? [0] : section.statorAngles).map((angle) => (
          <path
            key={`${i} ${angle}`}
            d={svgPath([section[role].outside])}
            transform={`rotate(${toDegrees(angle)})`}
            fill="none"
            className={role === 'rotor' ? 'stroke-brass' : 'stroke-steel'}
            strokeDasharray="7 4"
            strokeWidth="1.5"
            vectorEffect="non-scaling-stroke"
          />
        )),
      )}
    </g>
  );
}
