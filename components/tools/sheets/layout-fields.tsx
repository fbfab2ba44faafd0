'use client';

import { SelectField } from '@/components/ui/select-field';
import type { KerfState } from '@/geometry/cutting/cut-path';
import type { Machine } from '@/geometry/cutting/machine';
import { MeasureField } from './measure-field';

/** What is asked of a layout. mm */
export interface Asked {
  readonly machine: string;
  /** Sheet of the workshop's store where it has some, or of the size given. */
  readonly from: 'store' | 'size';
  readonly width: number;
  readonly height: number;
  readonly count: number;
  readonly copies: number;
  readonly gap: number;
  readonly margin: number;
  readonly rotations: number;
  readonly kerf: KerfState;
}

const rotations = [
  { value: '1', label: 'as drawn, for a grain' },
  { value: '2', label: 'half turns' },
  { value: '4', label: 'quarter turns' },
  { value: '8', label: 'steps of 45°' },
  { value: '12', label: 'steps of 30°' },
] as const;

const kerfs = [
  { value: 'nominal', label: 'nominal, not allowed for' },
  { value: 'compensated', label: 'compensated, allowed for' },
] as const;

export function LayoutFields({
  asked,
  machines,
  onChange,
}: {
  asked: Asked;
  machines: readonly Machine[];
  onChange: (change: Partial<Asked>) => void;
}) {
  const length = (
    label: string,
    key: 'width' | 'height' | 'gap' | 'margin',
    min: number,
    max: number,
  ) => (
    <MeasureField
      label={label}
      quantity="length"
      value={asked[key]}
      min={min}
      max={max}
      onChange={(value) => onChange({ [key]: value })}
    />
  );
  const count = (label: string, key: 'count' | 'copies', max: number) => (
    <MeasureField
      label={label}
      quantity="count"
      value={asked[key]}
      min={1}
      max={max}
      onChange={(value) => onChange({ [key]: value })}
    />
  );
  return (
    <div className="grid grid-cols-2 gap-x-4 gap-y-3">
      <SelectField
        label="Machine"
        value={
          machines.some(({ name }) => name === asked.machine)
            ? asked.machine
            : machines[0]!.name
        }
        options={machines.map(({ name }) => ({ value: name, label: name }))}
        onChange={(machine) => onChange({ machine })}
      />
      <SelectField
        label="Kerf"
        value={asked.kerf}
        options={kerfs}
        onChange={(kerf) => onChange({ kerf })}
      />
      <SelectField
        label="Sheet taken"
        value={asked.from}
        options={[
          { value: 'store', label: 'from the workshop’s store' },
          { value: 'size', label: 'of the size below' },
        ]}
        onChange={(from) => onChange({ from })}
      />
      {length('Sheet width', 'width', 20, 4000)}
      {length('Sheet height', 'height', 20, 4000)}
      {count('Sheets of each kind', 'count', 200)}
      {count('Capacitors', 'copies', 100)}
      {length('Gap between parts', 'gap', 0, 50)}
      {length('Margin to the edge', 'margin', 0, 100)}
      <SelectField
        label="Parts may be turned"
        value={String(asked.rotations) as (typeof rotations)[number]['value']}
        options={rotations}
        onChange={(value) => onChange({ rotations: Number(value) })}
      />
    </div>
  );
}
