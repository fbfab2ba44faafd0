'use client';

import { Label, Radio, RadioGroup } from 'react-aria-components/RadioGroup';

/** Which section of the capacitor form, floor and chart show. */
export function SectionPicker({
  count,
  section,
  onChange,
}: {
  count: number;
  section: number;
  onChange: (section: number) => void;
}) {
  return (
    <RadioGroup
      value={String(section)}
      onChange={(value) => onChange(Number(value))}
      orientation="horizontal"
      className="flex items-center gap-2"
    >
      <Label className="font-semibold">Section</Label>
      {Array.from({ length: count }, (_, index) => (
        <Radio
          key={index}
          value={String(index)}
          className="relative flex size-9 cursor-pointer items-center justify-center rounded-[3px] border border-edge bg-white max-bench:size-11 data-focus-visible:outline-2 data-focus-visible:outline-action data-selected:bg-ink data-selected:text-white"
        >
          {index + 1}
        </Radio>
      ))}
    </RadioGroup>
  );
}
