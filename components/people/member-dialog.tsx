'use client';

import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { peopleKey, removeMember, setRole } from '@/components/api/people';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Notice } from '@/components/ui/notice';
import { SelectField } from '@/components/ui/select-field';
import type { Member } from '@/lib/schemas/people';
import { roleHelp, roleOptions } from './role-words';

/** Gives a member another role, or removes them. */
export default function MemberDialog({
  member,
  what,
  isMe,
  onClose,
}: {
  member: Member;
  what: 'role' | 'remove';
  isMe: boolean;
  onClose: () => void;
}) {
  const client = useQueryClient();
  const router = useRouter();
  const [role, choose] = useState(member.role);
  const removes = what === 'remove';
  const change = useMutation({
    mutationFn: () => (removes ? removeMember(member.id) : setRole(member.id, role)),
    onSuccess: async () => {
      onClose();
      // What this person may see here has changed, or they are out.
      if (isMe) router.refresh();
      else await client.invalidateQueries({ queryKey: peopleKey });
    },
  });
  return (
    <Dialog
      title={removes ? `Remove ${member.name}?` : `Role of ${member.name}`}
      role={removes ? 'alertdialog' : 'dialog'}
      isOpen
      onClose={onClose}
    >
      {removes ? (
        <p>
          {isMe ? 'You leave the workshop' : `${member.name} is out of the workshop`} at once,
          in every browser. What was made and recorded stays; open invitations that{' '}
          {isMe ? 'you' : 'they'} sent are withdrawn. An invitation lets {isMe ? 'you' : 'them'}{' '}
          back in.
        </p>
      ) : (
        <>
          <SelectField label="Role" value={role} options={roleOptions} onChange={choose} />
          <p className="text-small text-ink-2">{roleHelp}</p>
        </>
      )}
      {change.isError && <Notice look="bad">{change.error.message}</Notice>}
      <div className="flex flex-wrap justify-end gap-2">
        <Button onPress={onClose} autoFocus={removes}>
          {removes ? 'Keep them' : 'Cancel'}
        </Button>
        <Button
          look={removes ? 'danger' : 'action'}
          isDisabled={change.isPending}
          onPress={() => change.mutate()}
        >
          {removes ? 'Remove' : 'Set the role'}
        </Button>
      </div>
    </Dialog>
  );
}
