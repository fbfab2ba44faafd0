'use client';

import { useId, useState } from 'react';
import { inputClass } from '@/components/ui/input-class';
import type { Spread } from '@/geometry/tolerance/random';
import type { Tolerance } from '@/geometry/tolerance/tolerances';

const DEGREES = 180 / Math.PI;

/** Largest tolerance that is one, mm or degrees. */
const MOST = 5;

/** One tolerance: its amount, and how it spreads. */
export function AmountRow({
  tolerance,
  inDegrees,
  onChange,
}: {
  tolerance: Tolerance;
  inDegrees: boolean;
  onChange: (tolerance: Tolerance) => void;
}) {
  const id = useId();
  const unit = inDegrees ? '°' : 'mm';
  const scale = inDegrees ? DEGREES : 1;
  const [text, setText] = useState(String(Number((tolerance.amount * scale).toPrecision(4))));
  const typed = Number(text.trim().replace(',', '.'));
  const fits = text.trim() !== '' && Number.isFinite(typed) && typed >= 0 && typed <= MOST;
  return (
    <div className="grid grid-cols-[1fr_6rem_7rem] items-center gap-x-2 gap-y-0.5">
      <label htmlFor={`${id}-amount`}>
        {tolerance.label}, ± {unit}
      </label>
      <input
        id={`${id}-amount`}
        value={text}
        inputMode="decimal"
        autoComplete="off"
        aria-invalid={!fits}
        aria-describedby={`${id}-help`}
        onChange={(event) => {
          setText(event.target.value);
          const value = Number(event.target.value.trim().replace(',', '.'));
          const usable = event.target.value.trim() !== '' && value >= 0 && value <= MOST;
          if (usable) onChange({ ...tolerance, amount: value / scale });
        }}
        className={`${inputClass} text-right aria-invalid:border-2 aria-invalid:border-bad`}
      />
      <select
        aria-label={`${tolerance.label}, spread`}
        value={tolerance.spread}
        onChange={(event) => onChange({ ...tolerance, spread: event.target.value as Spread })}
        className={inputClass}
      >
        <option value="even">even</option>
        <option value="normal">normal, 2σ</option>
      </select>
      <p id={`${id}-help`} className="col-span-3 text-small text-ink-2">
        {fits ? tolerance.help : `“${text}” is no tolerance; give 0 to ${MOST} ${unit}.`}
      </p>
    </div>
  );
}
