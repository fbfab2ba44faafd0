'use client';

import { useEffect, useState } from 'react';
import { Button } from '@/components/ui/button';
import { LocalTime } from '@/components/ui/local-time';
import { Notice } from '@/components/ui/notice';
import type { Unsaved } from './unsaved-store';
import { useNews } from './use-news';
import type { Saving } from './use-saving';

const rowClass = 'flex flex-wrap items-center justify-between gap-x-4 gap-y-2';

/** Work brought back after a reload, and what others did meanwhile. */
export function EditNotices({
  saving,
  unsaved,
  userId,
  trouble,
  onSaveAsNew,
}: {
  saving: Saving;
  unsaved: { restored: Unsaved | null; accept: () => void };
  userId: string;
  /** Why the work could not be saved as a new design. */
  trouble: string | undefined;
  onSaveAsNew: () => void;
}) {
  const { stored, dirty, state, adopt } = saving;
  const { restored, accept } = unsaved;
  const { later, gone } = useNews(stored);
  const [openedVersion] = useState(stored.version);

  useEffect(() => {
    // Nothing of one's own is on the screen, so the newer version can simply take its place.
    if (!later || dirty || restored || state !== 'idle') return;
    adopt(later);
  }, [adopt, dirty, later, restored, state]);
  const taken = stored.version > openedVersion && stored.updatedBy.id !== userId;

  return (
    <>
      {trouble && <Notice look="bad">Not saved as a new design. {trouble}</Notice>}
      {gone && (
        <Notice look="bad">
          <div className={rowClass}>
            <p>
              Somebody of the workshop deleted this design. What you see is still on your
              screen.
            </p>
            <Button onPress={onSaveAsNew}>Save it as a new design</Button>
          </div>
        </Notice>
      )}
      {restored && dirty && (
        <Notice look="warn">
          <div className={rowClass}>
            <p>
              Your unsaved changes from <LocalTime iso={restored.at} /> are back on the screen.
              {restored.version < stored.version &&
                ` ${stored.updatedBy.name} has saved version ${stored.version} since; saving will ask what to do.`}
            </p>
            <span className="flex gap-2">
              <Button onPress={accept}>Keep them</Button>
              <Button
                onPress={() => {
                  adopt(stored);
                  accept();
                }}
              >
                Discard them
              </Button>
            </span>
          </div>
        </Notice>
      )}
      {later && dirty && (
        <Notice look="warn">
          {later.updatedBy.name} saved version {later.version} at{' '}
          <LocalTime iso={later.updatedAt} />. Your changes stay on the screen; saving will ask
          what to do with both.
        </Notice>
      )}
      {taken && !dirty && (
        <Notice>
          {stored.updatedBy.name} saved version {stored.version} at{' '}
          <LocalTime iso={stored.updatedAt} />; it is on the screen now.
        </Notice>
      )}
    </>
  );
}
