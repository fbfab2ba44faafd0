'use client';

import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useRouter } from 'next/navigation';
import { designKeys } from '@/components/api/design-keys';
import { loadRevisions } from '@/components/api/load-revisions';
import { revisionKeys } from '@/components/api/revision-keys';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Notice } from '@/components/ui/notice';
import type { Restore } from '@/lib/schemas/revision';

/** Asks before an earlier state becomes the newest version, and opens the design then. */
export default function RestoreDialog({
  designId,
  version,
  from,
  what,
  onClose,
}: {
  designId: string;
  /** The one that is saved, as the screen knows it. */
  version: number;
  from: Restore['from'];
  /** As `version 3`. */
  what: string;
  onClose: () => void;
}) {
  const client = useQueryClient();
  const router = useRouter();
  const restoring = useMutation({
    mutationFn: async () => (await loadRevisions()).restoreDesign(designId, { version, from }),
    onSuccess: (record) => {
      client.setQueryData(designKeys.record(designId), record);
      void client.invalidateQueries({ queryKey: revisionKeys.history(designId) });
      router.push(`/designs/${designId}`);
    },
  });
  return (
    <Dialog title={`Go on from ${what}?`} role="alertdialog" isOpen onClose={onClose}>
      <p>
        It becomes version {version + 1} of the design, to be changed further. Version {version}{' '}
        and every revision stay as they are.
      </p>
      {restoring.isError && <Notice look="bad">{restoring.error.message}</Notice>}
      <div className="flex flex-wrap justify-end gap-2">
        <Button onPress={onClose} autoFocus>
          Leave it
        </Button>
        <Button
          look="action"
          isDisabled={restoring.isPending || restoring.isSuccess}
          onPress={() => restoring.mutate()}
        >
          Restore {what}
        </Button>
      </div>
    </Dialog>
  );
}
