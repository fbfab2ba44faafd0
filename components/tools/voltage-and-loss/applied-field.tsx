'use client';

import { useState } from 'react';
import { TextField } from '@/components/ui/text-field';
import { loadReader } from '@/components/units/load-reader';
import { formatQuantity } from '@/geometry';

/** A value of the design that is changed from here: when the field is left, or by Enter. */
export function AppliedField({
  label,
  description,
  quantity,
  value,
  min,
  max,
  optional = false,
  onApply,
}: {
  label: string;
  description: string;
  quantity: 'altitude' | 'frequency';
  value: number | null;
  min: number;
  max: number;
  optional?: boolean;
  onApply: (value: number | null) => void;
}) {
  const written = value === null ? '' : formatQuantity(value, quantity, 6);
  const [typed, setTyped] = useState<string | null>(null);
  const [wrong, setWrong] = useState<string | null>(null);

  async function take(text: string) {
    const empty = optional && text.trim() === '';
    const unit = quantity === 'altitude' ? 'm' : 'kHz';
    const read = empty ? null : (await loadReader())(text, quantity, unit);
    if (!empty && (read === null || read < min || read > max)) {
      setWrong(text);
      return;
    }
    setWrong(null);
    setTyped(null);
    if (read !== value) onApply(read);
  }

  return (
    <TextField
      label={label}
      description={description}
      value={typed ?? written}
      autoComplete="off"
      onChange={setTyped}
      onBlur={() => typed !== null && void take(typed)}
      onKeyDown={(event) => {
        if (event.key === 'Enter' && typed !== null) void take(typed);
        // The library keeps a key to the field otherwise; Escape closes the tool round it.
        else event.continuePropagation();
      }}
      errorMessage={
        wrong === null || wrong !== typed
          ? undefined
          : `“${wrong}” is no ${quantity} from ${formatQuantity(min, quantity)} to ${formatQuantity(max, quantity)}.`
      }
    />
  );
}
