'use client';

import { LocalTime } from '@/components/ui/local-time';
import type { Saving } from './use-saving';

/** Where the work stands, in words; changes are read out. */
export function SaveState({ saving }: { saving: Saving }) {
  const { state, dirty, stored } = saving;
  return (
    <p role="status" className="text-ink-2">
      {state === 'saving' && 'saving'}
      {state === 'waiting' && (
        <span className="font-semibold text-warn">
          couldn&rsquo;t reach the server, will try again
        </span>
      )}
      {state === 'idle' && dirty && (
        <span className="font-semibold text-ink">unsaved changes</span>
      )}
      {state === 'idle' && !dirty && (
        <>
          version {stored.version}, saved <LocalTime iso={stored.updatedAt} /> by{' '}
          {stored.updatedBy.name}
        </>
      )}
    </p>
  );
}
