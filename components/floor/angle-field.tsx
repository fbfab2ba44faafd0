'use client';

import { useId, useRef, useState, type KeyboardEvent } from 'react';
import { angleAfterKey, readDegrees } from './angle-keys';
import type { AngleStore } from './angle-store';
import { toDegrees, toRadians, writeDegrees } from './degrees';
import { useAngle } from './use-angle';

/** A small field to type the shaft angle. @param travel rad. */
export function AngleField({ store, travel }: { store: AngleStore; travel: number }) {
  const id = useId();
  const input = useRef<HTMLInputElement>(null);
  const edited = useRef(false);
  const [problem, setProblem] = useState<string | null>(null);

  useAngle(store, (angle) => {
    if (input.current && !edited.current) input.current.value = writeDegrees(angle);
  });

  function show() {
    edited.current = false;
    setProblem(null);
    if (input.current) input.current.value = writeDegrees(store.get());
  }

  function take() {
    if (!input.current || !edited.current) return;
    const read = readDegrees(input.current.value, toDegrees(travel));
    if ('problem' in read) {
      setProblem(read.problem);
      return;
    }
    store.set(toRadians(read.degrees));
    show();
  }

  function onKeyDown(event: KeyboardEvent) {
    if (event.key === 'Enter') {
      // It may stand in a form, which Enter must not send.
      event.preventDefault();
      take();
    } else if (event.key === 'Escape') {
      show();
    } else if (event.key === 'ArrowUp' || event.key === 'ArrowDown') {
      event.preventDefault();
      const to = angleAfterKey(
        event.key,
        event.shiftKey,
        toDegrees(store.get()),
        toDegrees(travel),
      );
      if (to !== null) store.set(toRadians(to));
      show();
    }
  }

  return (
    <div className="flex flex-wrap items-center gap-x-2">
      <label htmlFor={id} className="font-medium">
        Shaft angle
      </label>
      <span className="relative">
        <input
          ref={input}
          id={id}
          type="text"
          inputMode="decimal"
          autoComplete="off"
          defaultValue={writeDegrees(store.get())}
          aria-invalid={problem !== null}
          aria-describedby={problem ? `${id}-problem` : undefined}
          onChange={() => (edited.current = true)}
          onBlur={take}
          onKeyDown={onKeyDown}
          onFocus={(event) => event.currentTarget.select()}
          className="min-h-8 w-20 rounded-[3px] border border-edge bg-white py-1 pr-5 pl-2 text-right text-body text-ink aria-invalid:border-bad max-bench:min-h-11"
        />
        <span
          aria-hidden="true"
          className="absolute top-1/2 right-2 -translate-y-1/2 text-ink-2"
        >
          °
        </span>
      </span>
      {problem && (
        <span id={`${id}-problem`} role="alert" className="text-small text-bad">
          {problem}
        </span>
      )}
    </div>
  );
}
