'use client';

import { useController, useFormContext } from 'react-hook-form';
import { inputClass } from '@/components/ui/input-class';
import { RadioRow } from '@/components/ui/radio-row';
import type { ChoiceParameter } from '@/geometry';
import type { Draft } from './draft';
import { fieldId } from './focus-field';
import { useHelp } from './parameter-help';
import { LawCurve } from './law-curve';

interface ChoiceProps {
  path: string;
  parameter: ChoiceParameter;
}

/** A few short options side by side; the tuning laws with their curves. */
export function RadioField({ path, parameter }: ChoiceProps) {
  const { control } = useFormContext<Draft>();
  const { field } = useController({ control, name: `design.${path}` });
  const help = useHelp(path);
  const law = path.endsWith('.law');
  return (
    <RadioRow
      id={fieldId(path)}
      label={parameter.label}
      labelClass={law ? 'sr-only' : 'text-ink-2'}
      help={help}
      options={parameter.options.map(({ value, label }) => ({
        value,
        content: (
          <>
            {law && <LawCurve law={value} />}
            {label}
          </>
        ),
      }))}
      value={String(field.value)}
      onChange={field.onChange}
      onBlur={field.onBlur}
      className="flex flex-col gap-1.5"
      rowClass="dense flex flex-wrap overflow-hidden rounded-[3px] border border-edge bg-white"
      optionClass="flex min-h-9 grow flex-col items-center justify-center gap-0.5 border-l border-line px-1 py-1.5 text-[0.8125rem] first:border-0 hover:bg-page max-bench:min-h-11 has-focus-visible:outline-2 has-focus-visible:-outline-offset-3 has-focus-visible:outline-action has-checked:bg-ink has-checked:text-white has-checked:has-focus-visible:outline-white"
    />
  );
}

/** A list of longer options. */
export function ListField({ path, parameter }: ChoiceProps) {
  const { control } = useFormContext<Draft>();
  const { field } = useController({ control, name: `design.${path}` });
  return (
    <div className="grid grid-cols-[1fr_11rem] items-center gap-x-2">
      <label htmlFor={fieldId(path)} className="text-ink-2">
        {parameter.label}
      </label>
      <select
        id={fieldId(path)}
        value={String(field.value)}
        onChange={field.onChange}
        onBlur={field.onBlur}
        className={inputClass}
      >
        {parameter.options.map((option) => (
          <option key={option.value} value={option.value}>
            {option.label}
          </option>
        ))}
      </select>
    </div>
  );
}
