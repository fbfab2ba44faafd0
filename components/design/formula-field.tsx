'use client';

import { useId } from 'react';
import { useController, useFormContext } from 'react-hook-form';
import { inputClass } from '@/components/ui/input-class';
import type { TextParameter } from '@/geometry';
import { messageFor, type Draft, type DraftValue } from './draft';
import { fieldId } from './focus-field';

/** A text that the kernel reads; what it finds wrong stands among the checks. */
export default function FormulaField({
  path,
  parameter,
}: {
  path: string;
  parameter: TextParameter;
}) {
  const id = useId();
  const { control } = useFormContext<Draft>();
  const { field } = useController({ control, name: `design.${path}` });
  const message = messageFor(parameter, path, field.value as DraftValue);
  return (
    <div className="flex flex-col gap-1">
      <label htmlFor={fieldId(path)} className="text-ink-2">
        {parameter.label}
      </label>
      <input
        id={fieldId(path)}
        value={String(field.value ?? '')}
        onChange={field.onChange}
        onBlur={field.onBlur}
        spellCheck={false}
        autoComplete="off"
        aria-invalid={message !== undefined}
        aria-describedby={`${id}-help ${id}-message`}
        className={inputClass}
      />
      <p id={`${id}-help`} className="text-small text-ink-2">
        In x, the swept fraction: 0 where the law begins, 1 where it ends. Any scale; it must
        rise.
      </p>
      <p id={`${id}-message`} className="text-small text-bad">
        {message}
      </p>
    </div>
  );
}
