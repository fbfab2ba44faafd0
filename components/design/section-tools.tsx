'use client';

import { useFormContext, useWatch } from 'react-hook-form';
import { Button } from '@/components/ui/button';
import { MAX_SECTIONS } from '@/geometry';
import type { Draft } from './draft';
import { SectionPicker } from './section-picker';

/** Picks, adds and removes the sections on the shaft. */
export function SectionTools({
  section,
  onChange,
}: {
  section: number;
  onChange: (section: number) => void;
}) {
  const { control, getValues, setValue } = useFormContext<Draft>();
  const count = useWatch({ control, name: 'design.sections' }).length;

  function add() {
    const sections = getValues('design.sections');
    const copied = sections[section];
    if (!copied) return;
    setValue('design.sections', [...sections, { ...copied }]);
    onChange(sections.length);
  }

  function remove() {
    const sections = getValues('design.sections');
    onChange(Math.max(0, section - 1));
    setValue(
      'design.sections',
      sections.filter((_, index) => index !== section),
    );
  }

  return (
    <div className="flex flex-wrap items-center justify-between gap-2">
      {count > 1 ? (
        <SectionPicker count={count} section={section} onChange={onChange} />
      ) : (
        <p className="text-ink-2">One section</p>
      )}
      <span className="flex gap-1">
        {count < MAX_SECTIONS && (
          <Button look="quiet" onPress={add} className="px-2">
            Add a section
          </Button>
        )}
        {count > 1 && (
          <Button look="quiet" onPress={remove} className="px-2">
            Remove
          </Button>
        )}
      </span>
    </div>
  );
}
