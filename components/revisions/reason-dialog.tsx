'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Notice } from '@/components/ui/notice';
import { TextArea } from '@/components/ui/text-area';
import type { Revision } from '@/lib/schemas/revision';
import { useMove } from './use-move';

const words = {
  draft: {
    title: (number: number) => `Send revision ${number} back`,
    meaning: 'It becomes a draft again. The reason stands in the record.',
    send: 'Send it back',
    look: 'action',
  },
  withdrawn: {
    title: (number: number) => `Withdraw revision ${number}?`,
    meaning:
      'Nobody can download its files any more, open cut orders of it stop, and everybody is told. It cannot be released again.',
    send: 'Withdraw it',
    look: 'danger',
  },
} as const;

/** Moves a revision where that needs a reason. */
export default function ReasonDialog({
  revision,
  to,
  onClose,
}: {
  revision: Revision;
  to: 'draft' | 'withdrawn';
  onClose: () => void;
}) {
  const [reason, setReason] = useState('');
  const move = useMove(revision, onClose);
  const { title, meaning, send, look } = words[to];
  return (
    <Dialog title={title(revision.number)} isOpen onClose={onClose}>
      <form
        onSubmit={(event) => {
          event.preventDefault();
          move.mutate({ to, from: revision.state, reason });
        }}
        className="flex flex-col gap-4"
      >
        <p>{meaning}</p>
        <TextArea
          label="Reason"
          value={reason}
          onChange={setReason}
          maxLength={500}
          autoFocus
        />
        {move.isError && <Notice look="bad">{move.error.message}</Notice>}
        <div className="flex flex-wrap justify-end gap-2">
          <Button onPress={onClose}>Cancel</Button>
          <Button type="submit" look={look} isDisabled={move.isPending}>
            {send}
          </Button>
        </div>
      </form>
    </Dialog>
  );
}
