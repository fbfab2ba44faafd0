'use client';

import { useMemo, useRef } from 'react';
import type { SectionResult } from '@/geometry';
import type { AngleStore } from './angle-store';
import { writeDegrees } from './degrees';
import { lawReader } from './law-series';
import { useAngle } from './use-angle';

/** The read-out on the floor: shaft angle, total capacitance there, and what it tunes to. */
export function FloorReadout({
  section,
  store,
}: {
  section: SectionResult;
  store: AngleStore;
}) {
  const angleRef = useRef<HTMLElement>(null);
  const capacitanceRef = useRef<HTMLElement>(null);
  const frequencyRef = useRef<HTMLElement>(null);
  const read = useMemo(() => lawReader(section), [section]);

  useAngle(store, (angle) => {
    const reading = read(angle);
    if (angleRef.current) angleRef.current.textContent = `${writeDegrees(angle)}°`;
    if (capacitanceRef.current) capacitanceRef.current.textContent = reading.capacitance;
    if (frequencyRef.current) frequencyRef.current.textContent = reading.frequency;
  });

  return (
    <dl
      data-part="readout"
      className="pointer-events-none flex flex-wrap gap-x-1.5 px-3 pt-2 font-mono text-small text-scribe @xl:absolute @xl:top-1 @xl:left-1 @xl:grid @xl:gap-x-2.5 @xl:grid-cols-[auto_auto]"
    >
      <dt>angle</dt>
      <dd ref={angleRef} className="text-right not-last:mr-1 @xl:mr-0!" />
      <dt>total</dt>
      <dd ref={capacitanceRef} className="text-right not-last:mr-1 @xl:mr-0!" />
      {section.inductance !== null && (
        <>
          <dt>tunes</dt>
          <dd ref={frequencyRef} className="text-right not-last:mr-1 @xl:mr-0!" />
        </>
      )}
    </dl>
  );
}

/** Which plate is which, in the hatch and colours of the floor. */
export function FloorKey({
  section,
  step,
  limit,
}: {
  section: SectionResult;
  /** Between rings, mm. */
  step: number;
  limit: { readonly text: string; readonly shown: boolean };
}) {
  return (
    <ul className="pointer-events-none flex flex-wrap gap-x-4 gap-y-0.5 px-3 pb-2 font-mono text-small text-scribe @xl:absolute @xl:bottom-1 @xl:left-1 @xl:flex-col">
      <li className="flex items-center gap-2">
        <span className="h-3 w-4 border-2 border-brass bg-brass/65" aria-hidden="true" />
        {section.rotor.quantity} rotor
      </li>
      <li className="flex items-center gap-2">
        <span
          className="h-3 w-4 border-2 border-steel bg-[repeating-linear-gradient(135deg,var(--color-steel)_0_1px,transparent_1px_4px)]"
          aria-hidden="true"
        />
        {section.stator.quantity} stator
      </li>
      <li className="flex items-center gap-2">
        <span className="w-4 border-t border-scribe/60" aria-hidden="true" />
        ring every {step} mm
      </li>
      <li className="flex items-center gap-2">
        {limit.shown && (
          <span className="w-4 border-t-2 border-dashed border-scribe" aria-hidden="true" />
        )}
        <span className="@xl:max-w-44">
          {limit.shown ? limit.text : `${limit.text}, outside this view`}
        </span>
      </li>
    </ul>
  );
}
