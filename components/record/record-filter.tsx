'use client';

import { useId } from 'react';
import { inputClass } from '@/components/ui/input-class';
import { SelectField } from '@/components/ui/select-field';

/** The filter as it is set on the screen; days in the reader's own time zone. */
export interface Wanted {
  readonly who: string;
  readonly what: string;
  readonly firstDay: string;
  readonly lastDay: string;
}

function DayField({
  label,
  value,
  onChange,
}: {
  label: string;
  value: string;
  onChange: (value: string) => void;
}) {
  const id = useId();
  return (
    <div className="flex flex-col gap-1">
      <label htmlFor={id} className="font-medium">
        {label}
      </label>
      <input
        id={id}
        type="date"
        value={value}
        max="9999-12-31"
        onChange={(event) => onChange(event.target.value)}
        className={inputClass}
      />
    </div>
  );
}

/** Whose deeds, which, and of which days. */
export function RecordFilter({
  wanted,
  people,
  words,
  onChange,
}: {
  wanted: Wanted;
  people: readonly { readonly id: string; readonly name: string }[];
  words: Readonly<Record<string, string>>;
  onChange: (wanted: Wanted) => void;
}) {
  const everyone = { value: '', label: 'everybody' };
  const everything = { value: '', label: 'everything' };
  return (
    <div className="flex flex-wrap items-end gap-3">
      <SelectField
        label="Person"
        value={wanted.who}
        options={[everyone, ...people.map(({ id, name }) => ({ value: id, label: name }))]}
        onChange={(who) => onChange({ ...wanted, who })}
      />
      <SelectField
        label="Done"
        value={wanted.what}
        options={[
          everything,
          ...Object.entries(words).map(([value, label]) => ({ value, label })),
        ]}
        onChange={(what) => onChange({ ...wanted, what })}
      />
      <DayField
        label="First day"
        value={wanted.firstDay}
        onChange={(firstDay) => onChange({ ...wanted, firstDay })}
      />
      <DayField
        label="Last day"
        value={wanted.lastDay}
        onChange={(lastDay) => onChange({ ...wanted, lastDay })}
      />
    </div>
  );
}
