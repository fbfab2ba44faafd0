'use client';

import { useMemo, useRef } from 'react';
import type { SectionResult } from '@/geometry';
import type { AngleStore } from './angle-store';
import { writeDegrees } from './degrees';
import { lawReader } from './law-series';
import { useAngle } from './use-angle';

/** The read-out on the floor: mesh angle, total capacitance there, and what it tunes to. */
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
      className="pointer-events-none absolute top-3 left-4 grid grid-cols-[auto_auto] gap-x-2.5 font-mono text-small text-scribe"
    >
      <dt>angle</dt>
      <dd ref={angleRef} className="text-right" />
      <dt>total</dt>
      <dd ref={capacitanceRef} className="text-right" />
      {section.inductance !== null && (
        <>
          <dt>tunes to</dt>
          <dd ref={frequencyRef} className="text-right" />
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
    <ul className="pointer-events-none absolute bottom-3 left-4 flex flex-col gap-0.5 font-mono text-small text-scribe">
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
        <span className="max-w-44">
          {limit.shown ? limit.text : `${limit.text}, outside this view`}
        </span>
      </li>
    </ul>
  );
}
