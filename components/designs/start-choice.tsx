'use client';

import { Label, Radio, RadioGroup } from 'react-aria-components/RadioGroup';
import type { ExampleEntry } from '@/components/api/examples';

export const startFromDefault = 'default';

const plain = {
  file: startFromDefault,
  name: 'Default design',
  description:
    'One section with a straight-line frequency law over 530 to 1700 kHz; it can be cut as it stands.',
};

/** What a new design starts from: the default, or one of the worked designs. */
export function StartChoice({
  value,
  onChange,
  examples,
}: {
  value: string;
  onChange: (value: string) => void;
  examples: readonly ExampleEntry[];
}) {
  return (
    <RadioGroup value={value} onChange={onChange} className="flex flex-col gap-1.5">
      <Label className="font-medium">Start from</Label>
      {[plain, ...examples].map((entry) => (
        <Radio
          key={entry.file}
          value={entry.file}
          className="relative grid min-h-11 grid-cols-[1.25rem_1fr] gap-x-2 rounded-[3px] border border-line bg-white px-3 py-2 data-focus-visible:outline-2 data-focus-visible:outline-action data-selected:border-action data-selected:bg-action-tint"
        >
          {({ isSelected }) => (
            <>
              <span
                aria-hidden="true"
                className={`mt-0.5 size-4 rounded-full border bg-white ${isSelected ? 'border-5 border-action' : 'border-edge'}`}
              />
              <span className="flex flex-col">
                <span className="font-semibold">{entry.name}</span>
                <span className="text-small text-ink-2">{entry.description}</span>
              </span>
            </>
          )}
        </Radio>
      ))}
    </RadioGroup>
  );
}
