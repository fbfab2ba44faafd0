'use client';

import { useState } from 'react';
import type { AngleStore } from '@/components/floor/angle-store';
import { Button } from '@/components/ui/button';
import type { Derived } from '@/geometry';
import type { AssemblyFormat } from './assembly-file';

const formats: readonly (readonly [AssemblyFormat, string])[] = [
  ['glb', 'glTF, metres'],
  ['stl', 'STL, mm'],
];

/** Saves the assembly with all its parts, at the angle shown, for other tools. */
export function AssemblyLinks({ derived, store }: { derived: Derived; store: AngleStore }) {
  const [state, setState] = useState<'idle' | 'busy' | 'failed'>('idle');

  async function save(format: AssemblyFormat) {
    setState('busy');
    try {
      const { saveAssembly } = await import('./save-assembly');
      await saveAssembly(derived, store.get(), format);
      setState('idle');
    } catch {
      setState('failed');
    }
  }

  return (
    <div
      role="group"
      aria-label="Save the assembly at this angle"
      className="flex flex-wrap items-center border-t border-line pl-2 text-small"
    >
      <span role="status" className={state === 'failed' ? 'text-bad' : 'text-ink-2'}>
        {state === 'busy'
          ? 'Writing the file'
          : state === 'failed'
            ? 'It could not be written; try again'
            : 'Save it as'}
      </span>
      {formats.map(([format, label]) => (
        <Button
          key={format}
          look="quiet"
          className="grow px-1.5! text-small!"
          isDisabled={state === 'busy'}
          onPress={() => void save(format)}
        >
          {label}
        </Button>
      ))}
    </div>
  );
}
