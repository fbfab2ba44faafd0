'use client';

import { RadioRow } from '@/components/ui/radio-row';

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
    <RadioRow
      label="Section"
      labelClass="font-semibold"
      options={Array.from({ length: count }, (_, index) => ({
        value: String(index),
        content: index + 1,
      }))}
      value={String(section)}
      onChange={(value) => onChange(Number(value))}
      className="flex items-center gap-2"
      rowClass="flex gap-2"
      optionClass="flex size-9 items-center justify-center rounded-[3px] border border-edge bg-white max-bench:size-11 has-focus-visible:outline-2 has-focus-visible:outline-action has-checked:bg-ink has-checked:text-white"
    />
  );
}
