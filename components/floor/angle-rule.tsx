'use client';

import { useEffect, useMemo, useRef, type KeyboardEvent } from 'react';
import type { SectionResult } from '@/geometry';
import { AngleCursor } from './angle-cursor';
import { AngleField } from './angle-field';
import { angleAfterKey } from './angle-keys';
import type { AngleStore } from './angle-store';
import { toDegrees, toRadians, writeDegrees } from './degrees';
import { INSET_LEFT, INSET_RIGHT } from './insets';
import { lawReader } from './law-series';
import { RuleNotes } from './rule-notes';
import { RuleScale } from './rule-scale';
import { useAngle } from './use-angle';
import { useAngleDrag } from './use-angle-drag';

/**
 * A protractor laid out straight: drag it anywhere, use its keys, or type into its field. For
 * assistive technology it is a slider; `section` lets it tell the capacitance with the angle.
 * @param travel rad.
 */
export function AngleRule({
  store,
  travel,
  section,
}: {
  store: AngleStore;
  travel: number;
  section?: SectionResult | undefined;
}) {
  const track = useRef<HTMLDivElement>(null);
  const slider = useRef<HTMLInputElement>(null);
  const flag = useRef<HTMLSpanElement>(null);
  const read = useMemo(() => section && lawReader(section), [section]);
  const drag = useAngleDrag(store, travel, track);
  const most = toDegrees(travel);
  const law = section && {
    from: toDegrees(section.law.from),
    to: toDegrees(section.law.to),
  };

  useEffect(() => store.setTravel(travel), [store, travel]);

  useAngle(store, (angle) => {
    const degrees = writeDegrees(angle);
    if (flag.current) flag.current.textContent = `${degrees}°`;
    if (slider.current) {
      slider.current.value = String(toDegrees(angle));
      slider.current.setAttribute(
        'aria-valuetext',
        [`${degrees} degrees`, read?.(angle).capacitance].filter(Boolean).join(', '),
      );
    }
  });

  function onKeyDown(event: KeyboardEvent) {
    if (event.altKey || event.ctrlKey || event.metaKey) return;
    const to = angleAfterKey(event.key, event.shiftKey, toDegrees(store.get()), most);
    if (to === null) return;
    event.preventDefault();
    store.set(toRadians(to));
  }

  return (
    <div className="bg-panel select-none" data-part="angle-rule">
      <div className="flex min-h-10 flex-wrap items-center gap-x-5 px-3 py-1">
        <AngleField store={store} travel={travel} />
        {section && <RuleNotes section={section} />}
      </div>
      <div
        className="relative h-12 overflow-x-clip cursor-ew-resize touch-none border-t border-line has-focus-visible:outline-2 has-focus-visible:-outline-offset-2 has-focus-visible:outline-action"
        {...drag}
        onPointerUp={() => slider.current?.focus({ preventScroll: true })}
      >
        {/* Keys and assistive technology meet a plain range input over the whole rule. */}
        <input
          ref={slider}
          type="range"
          aria-label="Angle rule"
          min={0}
          max={most}
          step="any"
          defaultValue={toDegrees(store.get())}
          onChange={(event) => store.set(toRadians(event.currentTarget.valueAsNumber))}
          onKeyDown={onKeyDown}
          className="pointer-events-none absolute inset-0 h-full w-full opacity-0"
        />
        <div
          ref={track}
          className="absolute inset-y-0"
          style={{ left: INSET_LEFT, right: INSET_RIGHT }}
        >
          <RuleScale travel={most} law={law} />
          <AngleCursor store={store} travel={travel}>
            <span
              ref={flag}
              className="absolute bottom-1 left-0 -translate-x-1/2 rounded-[3px] bg-bad px-1.5 py-0.5 font-mono text-small text-white"
            />
          </AngleCursor>
        </div>
      </div>
    </div>
  );
}
