'use client';

import { useRef, useState } from 'react';
import { FieldError, Input, Label, Text, TextField } from 'react-aria-components/TextField';
import { useController, useFormContext } from 'react-hook-form';
import { loadReader, readerNow } from '@/components/units/load-reader';
import { writeQuantity } from '@/geometry';
import { messageFor, type Draft, type DraftValue, type QuantityParameter } from './draft';
import { fieldId } from './focus-field';
import { useHelp } from './parameter-help';

function shown(value: DraftValue, { quantity }: QuantityParameter) {
  if (typeof value === 'number') return writeQuantity(value, quantity);
  return {
    number: typeof value === 'string' ? value : '',
    unit: writeQuantity(0, quantity).unit,
  };
}

/**
 * A quantity with its unit. Takes what people write (`365 pF`, `1/4 in`), a bare number in the
 * unit shown; leaves the value written in the workshop's unit.
 */
export function QuantityField({
  path,
  parameter,
  chosen,
}: {
  path: string;
  parameter: QuantityParameter;
  /** What the kernel takes where the field is left empty, if that is known. */
  chosen?: number | undefined;
}) {
  const { control } = useFormContext<Draft>();
  const { field } = useController({ control, name: `design.${path}` });
  const value = field.value as DraftValue;
  // From the value itself: what came back after a reload is checked as what was typed just now.
  const message = messageFor(parameter, path, value);
  const [editing, setEditing] = useState<{ text: string; unit: string } | null>(null);
  const latest = useRef('');
  const written = shown(value, parameter);
  const unit = editing?.unit ?? written.unit;
  const text = editing?.text ?? written.number;
  const bare = /^[\s\d./+-]*$/.test(text);

  function settle(typed: string, read: (typed: string) => number | null) {
    if (typed.trim() === '' && parameter.kind === 'optional-number') field.onChange(null);
    else field.onChange(read(typed) ?? typed);
  }

  function change(typed: string) {
    setEditing({ text: typed, unit });
    latest.current = typed;
    const reader = readerNow();
    if (reader) {
      settle(typed, (raw) => reader(raw, parameter.quantity, unit));
      return;
    }
    loadReader().then(
      (late) => {
        // A later keystroke speaks for itself.
        if (latest.current === typed) {
          settle(typed, (raw) => late(raw, parameter.quantity, unit));
        }
      },
      () => field.onChange(typed),
    );
  }

  const { label, min, max } = parameter;
  const help = useHelp(path);
  const hint = chosen === undefined ? null : writeQuantity(chosen, parameter.quantity, 3);
  const low = writeQuantity(min, parameter.quantity);
  const high = writeQuantity(max, parameter.quantity);
  return (
    <TextField
      id={fieldId(path)}
      value={text}
      onChange={change}
      onFocus={() => {
        void loadReader().catch(() => undefined);
        setEditing({ text: written.number, unit: written.unit });
      }}
      onBlur={() => {
        setEditing(null);
        field.onBlur();
      }}
      isInvalid={message !== undefined}
      validationBehavior="aria"
      autoComplete="off"
      className="group grid grid-cols-[1fr_7.5rem] items-center gap-x-2"
    >
      <Label className="leading-tight text-ink-2 group-data-invalid:text-bad">{label}</Label>
      <span className="relative">
        <Input
          inputMode="text"
          placeholder={
            parameter.kind === 'optional-number'
              ? ['chosen', hint?.number].filter(Boolean).join(' ')
              : undefined
          }
          spellCheck={false}
          className={`min-h-8 w-full rounded-[3px] border border-edge bg-white py-1 pl-2 text-right outline-offset-0 placeholder:text-ink-2 max-bench:min-h-11 data-invalid:border-2 data-invalid:border-bad ${bare && unit ? unitRoom[unit.length] : 'pr-2'}`}
        />
        {bare && unit && (
          <span
            aria-hidden="true"
            className="pointer-events-none absolute inset-y-0 right-2 flex items-center text-ink-2"
          >
            {unit}
          </span>
        )}
      </span>
      <Text slot="description" className="sr-only">
        {help} {unit && `In ${unit} unless you write the unit,`} {low.number} {low.unit} to{' '}
        {high.number} {high.unit}
        {parameter.kind === 'optional-number' ? ', or empty' : ''}
        {hint && value === null ? `: now ${hint.number} ${hint.unit} is chosen` : ''}.
      </Text>
      <FieldError className="col-span-2 pt-1 text-small text-bad">{message}</FieldError>
    </TextField>
  );
}

const unitRoom: Record<number, string> = { 1: 'pr-5', 2: 'pr-9', 3: 'pr-11' };
