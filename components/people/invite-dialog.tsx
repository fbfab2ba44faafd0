'use client';

import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { invitePerson, mailsKey, peopleKey } from '@/components/api/people';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Notice } from '@/components/ui/notice';
import { SelectField } from '@/components/ui/select-field';
import { TextField } from '@/components/ui/text-field';
import type { Role } from '@/lib/schemas/api';
import { roleHelp, roleOptions } from './role-words';

export default function InviteDialog({ onClose }: { onClose: () => void }) {
  const client = useQueryClient();
  const [email, setEmail] = useState('');
  const [role, setRole] = useState<Role>('builder');
  const invitation = useMutation({
    mutationFn: () => invitePerson({ email, role }),
    onSuccess: async () => {
      await Promise.all([
        client.invalidateQueries({ queryKey: peopleKey }),
        client.invalidateQueries({ queryKey: mailsKey }),
      ]);
      onClose();
    },
  });
  return (
    <Dialog title="Invite somebody" isOpen onClose={onClose}>
      <form
        onSubmit={(event) => {
          event.preventDefault();
          invitation.mutate();
        }}
        className="flex flex-col gap-4"
      >
        <p>
          They get a mail with a link that opens once, within seven days. A newer invitation to
          the same address replaces the one before.
        </p>
        <TextField
          label="Email"
          type="email"
          autoComplete="off"
          value={email}
          onChange={setEmail}
          autoFocus
        />
        <SelectField label="Role" value={role} options={roleOptions} onChange={setRole} />
        <p className="text-small text-ink-2">{roleHelp}</p>
        {invitation.isError && <Notice look="bad">{invitation.error.message}</Notice>}
        <div className="flex flex-wrap justify-end gap-2">
          <Button onPress={onClose}>Cancel</Button>
          <Button type="submit" look="action" isDisabled={invitation.isPending}>
            {invitation.isPending ? 'Inviting' : 'Invite'}
          </Button>
        </div>
      </form>
    </Dialog>
  );
}
