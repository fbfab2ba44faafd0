'use client';

import { useId, useRef, useState, type CSSProperties } from 'react';
import { formatQuantity } from '@/geometry/quantity';
import type { Derived, Turn } from '@/geometry';
import { rotorTurn } from '@/geometry/rotor-turn';
import type { AngleStore } from './angle-store';
import { toDegrees, writeDegrees } from './degrees';
import { FloorKey, FloorReadout } from './floor-lettering';
import { OtherPlates, RotorPlate, StatorPlate } from './floor-plates';
import { floorGrid } from './polar-grid';
import { PolarLines, RingLetters } from './polar-lines';
import { useAngle } from './use-angle';
import { useRotorDrag } from './use-rotor-drag';
import { assumedView, useFittedView } from './use-fitted-view';

/**
 * One section in plan, or all laid over it, on the marking-out blue floor, seen along the shaft. It fills its container;
 * the rotor turns with the store, by no render, and can be turned by dragging it.
 */
export function Floor({
  derived,
  section: index,
  store,
}: {
  derived: Derived;
  /** Index of the section. */
  section: number;
  store: AngleStore;
}) {
  const id = useId();
  const frame = useRef<HTMLDivElement>(null);
  const rotorLayer = useRef<SVGSVGElement>(null);
  const [overlaid, setOverlaid] = useState(false);
  const { design, turn, stack, sections } = derived;
  const section = sections[index];
  if (!section) throw new RangeError(`invalid section: ${index} of ${sections.length}`);

  const others = overlaid ? sections.filter((_, i) => i !== index) : [];

  const grid = floorGrid(stack.outerRadius, design.largestRadius);
  const view = assumedView(grid.radius);
  const limit = `largest radius ${formatQuantity(design.largestRadius, 'length')}`;

  useFittedView(frame, grid.radius);
  useAngle(store, (angle) => {
    const layer = rotorLayer.current;
    if (!layer) return;
    layer.style.transform = turned(turn, angle);
    layer.dataset.angle = writeDegrees(angle);
  });
  const drag = useRotorDrag(store, frame, turn.direction);
  const layer = {
    viewBox: view.viewBox,
    'aria-hidden': true,
    className: 'absolute inset-0 h-full w-full',
  } as const;

  return (
    <div className="@container relative flex h-full min-h-80 w-full flex-col overflow-hidden bg-floor select-none">
      <FloorReadout section={section} store={store} />
      {sections.length > 1 && (
        <button
          type="button"
          aria-pressed={overlaid}
          onClick={() => setOverlaid(!overlaid)}
          className="absolute top-2 right-2 z-10 min-h-8 rounded-[3px] border border-scribe/60 bg-floor px-2 text-small text-scribe aria-pressed:bg-scribe aria-pressed:text-floor max-bench:min-h-11"
        >
          All sections
        </button>
      )}
      {/* Three layers, so that turning moves a picture of the rotor and draws nothing again. */}
      <div
        ref={frame}
        role="img"
        aria-label={`Plan of section ${index + 1}`}
        aria-describedby={`${id}-text`}
        data-part="floor"
        className="relative min-h-0 grow"
        style={{ '--px': view.unit } as CSSProperties}
      >
        <svg {...layer}>
          <Hatch id={`${id}-hatch`} size={grid.radius / 32} />
          <PolarLines grid={grid} />
          <g transform="scale(1 -1)">
            <StatorPlate section={section} hatch={`${id}-hatch`} />
            <OtherPlates sections={others} role="stator" />
          </g>
          {grid.limitShown && (
            <circle
              data-part="limit"
              r={design.largestRadius}
              className="fill-none stroke-scribe"
              strokeDasharray="6 5"
              vectorEffect="non-scaling-stroke"
            />
          )}
        </svg>
        <svg
          {...layer}
          ref={rotorLayer}
          data-part="rotor"
          className={`${layer.className} pointer-events-none will-change-transform`}
          style={{ transform: turned(turn, store.get()) }}
        >
          <g transform="scale(1 -1)">
            <RotorPlate
              section={section}
              shaftRadius={design.shaftDiameter / 2}
              mark={grid.radius}
              drag={drag}
            />
            <OtherPlates sections={others} role="rotor" />
          </g>
        </svg>
        <svg {...layer} className={`${layer.className} pointer-events-none`}>
          <RingLetters grid={grid} from={design.hubRadius} />
        </svg>
      </div>
      <p id={`${id}-text`} className="sr-only">
        {describe(section, limit)}
      </p>
      <FloorKey
        section={section}
        step={grid.step}
        limit={{ text: limit, shown: grid.limitShown }}
      />
    </div>
  );
}

/** The rotor is drawn at mesh angle 0. CSS turns clockwise, the drawing counter-clockwise. */
const turned = (turn: Turn, angle: number) =>
  `rotate(${-toDegrees(rotorTurn(turn, angle))}deg)`;

/** Scribed lines across the stator, `size` mm apart. */
function Hatch({ id, size }: { id: string; size: number }) {
  return (
    <defs>
      <pattern
        id={id}
        width={size}
        height={size}
        patternUnits="userSpaceOnUse"
        patternTransform="rotate(45)"
      >
        <path d={`M0 0V${size}`} className="stroke-steel/80" strokeWidth={size / 6} />
      </pattern>
    </defs>
  );
}

function describe(
  { rotor, stator, statorAngles, posts, sweepRadius }: Derived['sections'][number],
  limit: string,
) {
  return (
    `${rotor.quantity} rotor plates that sweep ${formatQuantity(sweepRadius, 'length', 4)} from the shaft, ` +
    `${stator.quantity} stator plates${statorAngles.length > 1 ? ' in two stators' : ''} on ${posts.length} posts; ${limit}. ` +
    'The rotor is drawn at the shaft angle of the angle rule.'
  );
}
