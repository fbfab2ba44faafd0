'use client';

import { useId, useRef } from 'react';
import { formatQuantity } from '@/geometry/quantity';
import type { Derived } from '@/geometry';
import type { AngleStore } from './angle-store';
import { toDegrees } from './degrees';
import { FloorKey, FloorReadout } from './floor-lettering';
import { RotorPlate, StatorPlate } from './floor-plates';
import { floorGrid } from './polar-grid';
import { PolarLines, RingLetters } from './polar-lines';
import { useAngle } from './use-angle';
import { useRotorDrag } from './use-rotor-drag';
import { useUnitScale } from './use-unit-scale';

/** Room round the outermost ring for its lettering, as a share of its radius. */
const MARGIN = 1.13;

/**
 * One section in plan on the marking-out blue floor, seen along the shaft. It fills its container;
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
  const svgRef = useRef<SVGSVGElement>(null);
  const rotorRef = useRef<SVGGElement>(null);
  const { design, stack, sections } = derived;
  const section = sections[index];
  if (!section) throw new RangeError(`invalid section: ${index} of ${sections.length}`);

  const grid = floorGrid(stack.outerRadius, design.largestRadius);
  const half = grid.radius * MARGIN;
  const limit = `largest radius ${formatQuantity(design.largestRadius, 'length')}`;

  useUnitScale(svgRef, 2 * half);
  useAngle(store, (angle) => {
    rotorRef.current?.setAttribute('transform', `rotate(${toDegrees(angle)})`);
  });
  const drag = useRotorDrag(store);

  return (
    <div className="relative h-full min-h-80 w-full overflow-hidden bg-floor select-none">
      <svg
        ref={svgRef}
        role="img"
        aria-label={`Plan of section ${index + 1}`}
        aria-describedby={`${id}-text`}
        viewBox={`${-half} ${-half} ${2 * half} ${2 * half}`}
        className="absolute inset-0 h-full w-full"
        style={{ '--px': (2 * half) / 560 } as React.CSSProperties}
      >
        <defs>
          <pattern
            id={`${id}-hatch`}
            width={half / 36}
            height={half / 36}
            patternUnits="userSpaceOnUse"
            patternTransform="rotate(45)"
          >
            <path
              d={`M0 0V${half / 36}`}
              className="stroke-steel/80"
              strokeWidth={half / 220}
            />
          </pattern>
        </defs>
        <PolarLines grid={grid} />
        <g transform="scale(1 -1)">
          <StatorPlate section={section} hatch={`${id}-hatch`} />
          <RotorPlate
            ref={rotorRef}
            section={section}
            shaftRadius={design.shaftDiameter / 2}
            mark={grid.radius}
            angle={toDegrees(store.get())}
            drag={drag}
          />
        </g>
        {grid.limitShown && (
          <circle
            data-part="limit"
            r={design.largestRadius}
            className="pointer-events-none fill-none stroke-scribe"
            strokeDasharray="6 5"
            vectorEffect="non-scaling-stroke"
          />
        )}
        <RingLetters grid={grid} />
      </svg>
      <p id={`${id}-text`} className="sr-only">
        {describe(section, limit)}
      </p>
      <FloorReadout section={section} store={store} />
      <FloorKey
        section={section}
        limit={grid.limitShown ? limit : `${limit}, outside this view`}
      />
    </div>
  );
}

function describe(
  { rotor, stator, posts, sweepRadius }: Derived['sections'][number],
  limit: string,
) {
  return (
    `${rotor.quantity} rotor plates that sweep ${formatQuantity(sweepRadius, 'length', 4)} from the shaft, ` +
    `${stator.quantity} stator plates on ${posts.length} posts; ${limit}. ` +
    'The rotor is drawn at the mesh angle of the angle rule.'
  );
}
