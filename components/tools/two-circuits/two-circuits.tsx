'use client';

import { useState, type ComponentType } from 'react';
import { SelectField } from '@/components/ui/select-field';
import type { ToolProps } from '../tool-props';
import { EqualSections } from './equal-sections';
import { SettingUp } from './setting-up';
import { SeveralBands } from './several-bands';
import { TrackedOscillator } from './tracked-oscillator';

const views = {
  oscillator: { label: 'Oscillator section that tracks by its shape', View: TrackedOscillator },
  equal: { label: 'Equal sections with padder and trimmer', View: EqualSections },
  bands: { label: 'Several bands', View: SeveralBands },
  'setting-up': { label: 'Alignment, balance and coupling', View: SettingUp },
} as const satisfies Record<string, { label: string; View: ComponentType<ToolProps> }>;

type ViewName = keyof typeof views;

const options = (Object.keys(views) as ViewName[]).map((value) => ({
  value,
  label: views[value].label,
}));

/** Two circuits or more that one shaft tunes in step. */
export default function TwoCircuits(props: ToolProps) {
  const [name, setName] = useState<ViewName>('oscillator');
  const { View } = views[name];
  return (
    <>
      <SelectField label="To work on" value={name} options={options} onChange={setName} />
      <View {...props} />
    </>
  );
}
