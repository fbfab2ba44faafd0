'use client';

import { useState } from 'react';
import { TextField } from '@/components/ui/text-field';
import { loadReader } from '@/components/units/load-reader';
import { formatQuantity } from '@/geometry';

/** A length or a count that is not part of the design. Lengths take units as people write them. */
export function MeasureField({
  label,
  quantity,
  value,
  min,
  max,
  onChange,
}: {
  label: string;
  quantity: 'length' | 'count';
  value: number;
  min: number;
  max: number;
  onChange: (value: number) => void;
}) {
  const [text, setText] = useState(() => formatQuantity(value, quantity));
  const [wrong, setWrong] = useState(false);

  async function change(typed: string) {
    setText(typed);
    const read = (await loadReader())(typed, quantity, 'mm');
    const fits =
      read !== null &&
      read >= min &&
      read <= max &&
      (quantity === 'length' || Number.isInteger(read));
    setWrong(!fits);
    if (fits) onChange(read);
  }

  const range = `${formatQuantity(min, quantity)} to ${formatQuantity(max, quantity)}`;
  return (
    <TextField
      label={label}
      value={text}
      onChange={(typed) => void change(typed)}
      onBlur={() => {
        if (!wrong) setText(formatQuantity(value, quantity));
      }}
      inputMode={quantity === 'count' ? 'numeric' : 'text'}
      autoComplete="off"
      errorMessage={
        wrong
          ? `“${text}” is no ${quantity === 'count' ? 'whole number' : 'length'} from ${range}.`
          : undefined
      }
    />
  );
}
