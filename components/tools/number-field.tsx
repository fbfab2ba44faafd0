'use client';

import { useState } from 'react';
import { TextField } from '@/components/ui/text-field';

/** A number in a unit that its label names. */
export function NumberField({
  label,
  value,
  min,
  max,
  whole = false,
  onChange,
}: {
  label: string;
  value: number;
  min: number;
  max: number;
  whole?: boolean;
  onChange: (value: number) => void;
}) {
  const written = String(Number(value.toPrecision(6)));
  const [typed, setTyped] = useState<string | null>(null);
  const text = typed ?? written;
  const usable = (raw: string): number | null => {
    const number = Number(raw.trim().replace(',', '.'));
    const fits = raw.trim() !== '' && number >= min && number <= max;
    return fits && (!whole || Number.isInteger(number)) ? number : null;
  };
  return (
    <TextField
      label={label}
      value={text}
      inputMode="decimal"
      autoComplete="off"
      onChange={(raw) => {
        setTyped(raw);
        const number = usable(raw);
        if (number !== null) onChange(number);
      }}
      onBlur={() => usable(text) !== null && setTyped(null)}
      errorMessage={
        usable(text) === null
          ? `“${text}” is no ${whole ? 'whole ' : ''}number from ${min} to ${max}.`
          : undefined
      }
    />
  );
}
