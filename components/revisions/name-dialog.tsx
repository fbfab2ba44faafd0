'use client';

import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { loadRevisions } from '@/components/api/load-revisions';
import { revisionKeys } from '@/components/api/revision-keys';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Notice } from '@/components/ui/notice';
import { TextArea } from '@/components/ui/text-area';
import { TextField } from '@/components/ui/text-field';

/** Freezes the saved version of a design under a name. */
export default function NameDialog({
  designId,
  version,
  onClose,
}: {
  designId: string;
  /** The one that is saved, as the screen knows it. */
  version: number;
  onClose: () => void;
}) {
  const client = useQueryClient();
  const [name, setName] = useState('');
  const [note, setNote] = useState('');
  const naming = useMutation({
    mutationFn: async () =>
      (await loadRevisions()).nameRevision(designId, { version, name, note }),
    onSuccess: async () => {
      await client.invalidateQueries({ queryKey: revisionKeys.history(designId) });
      onClose();
    },
    onError: () => client.invalidateQueries({ queryKey: revisionKeys.history(designId) }),
  });
  return (
    <Dialog title="Name a revision" isOpen onClose={onClose}>
      <form
        onSubmit={(event) => {
          event.preventDefault();
          naming.mutate();
        }}
        className="flex flex-col gap-4"
      >
        <p>
          Version {version}, as it is saved, is kept for good under the next number, with its
          plates and files. It begins as a draft.
        </p>
        <TextField label="Name" value={name} onChange={setName} maxLength={80} autoFocus />
        <TextArea label="Note" value={note} onChange={setNote} maxLength={500} />
        {naming.isError && <Notice look="bad">{naming.error.message}</Notice>}
        <div className="flex flex-wrap justify-end gap-2">
          <Button onPress={onClose}>Cancel</Button>
          <Button type="submit" look="action" isDisabled={naming.isPending}>
            {naming.isPending ? 'Making its files' : 'Name it'}
          </Button>
        </div>
      </form>
    </Dialog>
  );
}
