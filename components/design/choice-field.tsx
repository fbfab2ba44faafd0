'use client';

import { Label, Radio, RadioGroup, Text } from 'react-aria-components/RadioGroup';
import { useController, useFormContext } from 'react-hook-form';
import { inputClass } from '@/components/ui/input-class';
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
    <RadioGroup
      id={fieldId(path)}
      value={String(field.value)}
      onChange={field.onChange}
      onBlur={field.onBlur}
      orientation="horizontal"
      className="flex flex-col gap-1.5"
    >
      <Label className={law ? 'sr-only' : 'text-ink-2'}>{parameter.label}</Label>
      <Text slot="description" className="sr-only">
        {help}
      </Text>
      <div className="dense flex flex-wrap overflow-hidden rounded-[3px] border border-edge bg-white">
        {parameter.options.map((option) => (
          <Radio
            key={option.value}
            value={option.value}
            className="relative flex min-h-9 grow cursor-pointer flex-col items-center justify-center gap-0.5 border-l border-line px-1 py-1.5 text-[0.8125rem] first:border-0 hover:bg-page max-bench:min-h-11 data-focus-visible:outline-2 data-focus-visible:-outline-offset-3 data-focus-visible:outline-action data-selected:bg-ink data-selected:text-white data-selected:data-focus-visible:outline-white"
          >
            {law && <LawCurve law={option.value} />}
            {option.label}
          </Radio>
        ))}
      </div>
    </RadioGroup>
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
