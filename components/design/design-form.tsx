'use client';

import dynamic from 'next/dynamic';
import { memo, use, useState, type ComponentProps } from 'react';
import { useFormContext, useWatch } from 'react-hook-form';
import type { ToolPlace } from '@/components/tools/places';
import { ToolLinks } from '@/components/tools/tool-links';
import { loadApi } from '@/components/api/load-api';
import { ChosenContext } from './chosen-values';
import { ListField, RadioField } from './choice-field';
import { applies } from '@/geometry';
import type { Draft } from './draft';
import { loadHelp } from './parameter-help';
import {
  sectionDeciding,
  sectionGroups,
  sharedDeciding,
  sharedGroups,
  type Group,
  type GroupEntry,
} from './parameter-groups';
import { QuantityField } from './quantity-field';

// For those who ask for a law of their own.
const PointsField = dynamic(() => import('./points-field'), { ssr: false });
const FormulaField = dynamic(() => import('./formula-field'), { ssr: false });

/** A field that may be left empty; only these are drawn anew with what the kernel chose. */
function OptionalField({
  name,
  ...field
}: { name: string } & Omit<ComponentProps<typeof QuantityField>, 'chosen'>) {
  return <QuantityField {...field} chosen={use(ChosenContext)[name]} />;
}

function Field({ entry, prefix }: { entry: GroupEntry; prefix: string }) {
  const { key, parameter } = entry;
  const path = prefix + key;
  if (parameter.kind === 'optional-number') {
    return <OptionalField name={key} path={path} parameter={parameter} />;
  }
  if (parameter.kind === 'points') return <PointsField path={path} parameter={parameter} />;
  if (parameter.kind === 'text') return <FormulaField path={path} parameter={parameter} />;
  if (parameter.kind !== 'choice') return <QuantityField path={path} parameter={parameter} />;
  return key === 'material' ? (
    <ListField path={path} parameter={parameter} />
  ) : (
    <RadioField path={path} parameter={parameter} />
  );
}

const places: Partial<Record<Group['group'], ToolPlace>> = { law: 'law', stack: 'stack' };

function Fields({ group, prefix }: { group: Group; prefix: string }) {
  const place = places[group.group];
  return (
    <fieldset className="flex flex-col gap-1.5">
      <legend className="wide-letter mb-2 font-semibold">{group.title}</legend>
      {group.entries.map((entry) => (
        <Field key={prefix + entry.key} entry={entry} prefix={prefix} />
      ))}
      {place && <ToolLinks place={place} />}
    </fieldset>
  );
}

/** The form's values of some keys; the form is drawn anew only when one of them changes. */
function useDeciding(prefix: string, keys: readonly string[]): Record<string, unknown> {
  const { control } = useFormContext<Draft>();
  const names = keys.map((key) => `${prefix}${key}` as 'design.travel');
  const values = useWatch({ control, name: names });
  return Object.fromEntries(keys.map((key, i) => [key, values[i]]));
}

/** All parameters of one section and those that the sections share, made from the kernel's table. */
export const DesignForm = memo(function DesignForm({ section }: { section: number }) {
  const ofSection = useDeciding(`design.sections.${section}.`, sectionDeciding);
  const ofDesign = useDeciding('design.', sharedDeciding);
  const prefix = `sections.${section}.`;
  const [help, setHelp] = useState('');

  /** The help of the field one is in stands at the foot; readers get it as its description. */
  function showHelp(target: HTMLElement) {
    const described = target.closest('[role=radiogroup]') ?? target;
    const read = () => {
      const ids = described.getAttribute('aria-describedby')?.split(' ') ?? [];
      const text = ids.map((id) => document.getElementById(id)?.textContent ?? '');
      setHelp(text[0] ?? '');
    };
    // What is there at once, and all of it after the first time.
    read();
    void loadHelp().then(() => requestAnimationFrame(read));
    void loadApi().catch(() => undefined);
  }

  return (
    <div
      className="flex flex-col gap-5 [&_input]:scroll-mb-28 [&_select]:scroll-mb-28"
      onFocus={(event) => showHelp(event.target)}
      onPointerEnter={() => void loadHelp()}
    >
      {sectionGroups.map((group) => (
        <Fields
          key={prefix + group.group}
          prefix={prefix}
          group={{
            ...group,
            entries: group.entries.filter(({ parameter }) => applies(parameter, ofSection)),
          }}
        />
      ))}
      {sharedGroups.map((group) => (
        <Fields
          key={group.group}
          prefix=""
          group={{
            ...group,
            entries: group.entries.filter(({ parameter }) => applies(parameter, ofDesign)),
          }}
        />
      ))}
      <p
        aria-hidden="true"
        className="sticky bottom-0 -mx-5 min-h-16 border-t max-bench:min-h-0 border-line bg-page px-5 py-2 text-small text-ink-2"
      >
        {help || 'Write a unit if you like: 365 pF, 0.02 in, 1/4 in, 530 kHz.'}
      </p>
    </div>
  );
});
