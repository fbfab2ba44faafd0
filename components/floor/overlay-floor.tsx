'use client';

import { useRef, type CSSProperties, type ReactNode, type RefObject } from 'react';
import type { Derived, Turn } from '@/geometry';
import { rotorTurn } from '@/geometry/rotor-turn';
import type { AngleStore } from './angle-store';
import { toDegrees } from './degrees';
import { polarGrid } from './polar-grid';
import { PolarLines, RingLetters } from './polar-lines';
import { svgPath } from './svg-path';
import { useAngle } from './use-angle';
import { assumedView, useFittedView } from './use-fitted-view';

/** How each of the two is drawn: the first solid, the second dashed and white. */
const looks = [
  { rotor: 'stroke-brass', stator: 'stroke-steel', dash: undefined },
  { rotor: 'stroke-white', stator: 'stroke-white', dash: '7 4' },
] as const;

/** The rotor is drawn at mesh angle 0. CSS turns clockwise, the drawing counter-clockwise. */
const turned = (turn: Turn, angle: number) =>
  `rotate(${-toDegrees(rotorTurn(turn, angle))}deg)`;

/** One of the two states whose outlines lie over one another. */
interface Overlaid {
  readonly title: string;
  readonly derived: Derived;
}

const layer = { 'aria-hidden': true, className: 'absolute inset-0 h-full w-full' } as const;

function Rotor({
  derived,
  section,
  store,
  viewBox,
  look,
}: {
  derived: Derived;
  section: number;
  store: AngleStore;
  viewBox: string;
  look: (typeof looks)[number];
}) {
  const picture: RefObject<SVGSVGElement | null> = useRef(null);
  useAngle(store, (angle) => {
    if (picture.current) picture.current.style.transform = turned(derived.turn, angle);
  });
  const rotor = derived.sections[section]?.rotor;
  if (!rotor) return null;
  return (
    <svg {...layer} ref={picture} viewBox={viewBox} data-part="rotor">
      <path
        transform="scale(1 -1)"
        d={svgPath([rotor.outside, ...rotor.holes])}
        className={`fill-none ${look.rotor}`}
        strokeWidth="2"
        strokeDasharray={look.dash}
        vectorEffect="non-scaling-stroke"
      />
    </svg>
  );
}

function Stator({
  derived,
  section,
  look,
}: {
  derived: Derived;
  section: number;
  look: (typeof looks)[number];
}) {
  const result = derived.sections[section];
  if (!result) return null;
  const path = svgPath([result.stator.outside, ...result.stator.holes]);
  return result.statorAngles.map((angle) => (
    <path
      key={angle}
      d={path}
      transform={`scale(1 -1) rotate(${toDegrees(angle)})`}
      className={`fill-none ${look.stator}`}
      strokeWidth="1.75"
      strokeDasharray={look.dash}
      vectorEffect="non-scaling-stroke"
    />
  ));
}

/** A line and what it is. */
function Line({ look, dash, children }: { look: string; dash?: string; children: ReactNode }) {
  return (
    <li className="flex items-center gap-2">
      <svg width="26" height="8" viewBox="0 0 26 8" aria-hidden="true">
        <path d="M0 4H26" strokeWidth="2" strokeDasharray={dash} className={look} />
      </svg>
      <span>{children}</span>
    </li>
  );
}

/** Rotor and stator of one section of two states, their outlines over one another. */
export function OverlayFloor({
  states,
  section,
  store,
}: {
  states: readonly [Overlaid, Overlaid];
  section: number;
  store: AngleStore;
}) {
  const frame = useRef<HTMLDivElement>(null);
  const grid = polarGrid(Math.max(...states.map(({ derived }) => derived.stack.outerRadius)));
  const { viewBox, unit } = assumedView(grid.radius);
  useFittedView(frame, grid.radius);
  const titles = states.map(({ title }) => title);
  return (
    <div className="@container flex h-full min-h-80 w-full flex-col overflow-hidden bg-floor select-none">
      <div
        ref={frame}
        role="img"
        aria-label={`Outlines of section ${section + 1}: ${titles[0]}, and over it ${titles[1]}`}
        data-part="overlay"
        className="relative min-h-0 grow"
        style={{ '--px': unit } as CSSProperties}
      >
        <svg {...layer} viewBox={viewBox}>
          <PolarLines grid={grid} />
          {states.map(({ derived }, index) => (
            <Stator key={index} derived={derived} section={section} look={looks[index]!} />
          ))}
        </svg>
        {states.map(({ derived }, index) => (
          <Rotor
            key={index}
            derived={derived}
            section={section}
            store={store}
            viewBox={viewBox}
            look={looks[index]!}
          />
        ))}
        <svg {...layer} viewBox={viewBox}>
          <RingLetters grid={grid} from={0} />
        </svg>
      </div>
      <ul
        aria-label="Lines"
        className="flex flex-wrap gap-x-5 gap-y-0.5 px-3 pb-2 font-mono text-small text-scribe"
      >
        <Line look="stroke-brass">rotor, {titles[0]}</Line>
        <Line look="stroke-steel">stator, {titles[0]}</Line>
        <Line look="stroke-white" dash={looks[1].dash}>
          both, {titles[1]}
        </Line>
      </ul>
    </div>
  );
}
