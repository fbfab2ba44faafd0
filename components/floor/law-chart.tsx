'use client';

import dynamic from 'next/dynamic';
import { useMemo, useRef, useState } from 'react';
import type { SectionResult } from '@/geometry';
import { AngleCursor } from './angle-cursor';
import type { AngleStore } from './angle-store';
import { INSET_LEFT, INSET_RIGHT } from './insets';
import { LawLegend } from './law-legend';
import { ErrorPlot, LawPlot } from './law-plots';
import { lawSeries } from './law-series';
import { useAngleDrag } from './use-angle-drag';

const LawTable = dynamic(() => import('./law-table'), { ssr: false });

/**
 * The law over the travel: capacitance asked and achieved, the error in a strip below, and the
 * frequency with a coil. It stands under the angle rule, which is the scale of its angles.
 */
export function LawChart({ section, store }: { section: SectionResult; store: AngleStore }) {
  const track = useRef<HTMLDivElement>(null);
  const [opened, setOpened] = useState(false);
  const travel = section.law.angle.at(-1)!;
  const series = useMemo(() => lawSeries(section), [section]);
  const drag = useAngleDrag(store, travel, track);

  return (
    <section aria-label="Law chart" className="bg-panel" data-part="law-chart">
      <div
        className="relative overflow-x-clip cursor-ew-resize touch-pan-y border-t border-line"
        {...drag}
      >
        <div aria-hidden="true">
          <div className="relative flow-root">
            <div className="relative mt-6 mb-1.5 h-32">
              <LawPlot series={series} />
            </div>
            <span className="absolute top-1 left-2 text-small text-brass-dark">
              {series.capacitance.unit}
            </span>
            {series.frequency && (
              <span className="absolute top-1 right-2 text-small text-action">
                {series.frequency.unit}
              </span>
            )}
          </div>
          <div className="relative flow-root border-t border-line">
            <div className="relative mt-6 mb-1.5 h-12">
              <ErrorPlot series={series} />
            </div>
            <span className="absolute top-1 left-2 text-small text-bad">error, % of range</span>
          </div>
        </div>
        <div
          ref={track}
          className="pointer-events-none absolute inset-y-0"
          style={{ left: INSET_LEFT, right: INSET_RIGHT }}
        >
          <AngleCursor store={store} travel={travel} />
        </div>
      </div>
      <LawLegend section={section} series={series} />
      <details
        className="border-t border-line"
        onToggle={(event) => setOpened(event.currentTarget.open)}
      >
        <summary className="cursor-pointer px-3 py-2.5 text-small font-medium max-bench:py-3.5">
          The chart in figures, every 10°
        </summary>
        {opened && <LawTable section={section} series={series} />}
      </details>
    </section>
  );
}
