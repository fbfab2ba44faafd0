'use client';

import { useQuery } from '@tanstack/react-query';
import Link from 'next/link';
import { lazy, Suspense, useState } from 'react';
import { fetchPeople, peopleKey } from '@/components/api/people';
import { Button } from '@/components/ui/button';
import { buttonClass } from '@/components/ui/button-class';
import type { Member, People } from '@/lib/schemas/people';
import { InvitationsTable } from './invitations-table';
import { MembersTable } from './members-table';

const InviteDialog = lazy(() => import('./invite-dialog'));
const MemberDialog = lazy(() => import('./member-dialog'));

type Open = 'invite' | { readonly member: Member; readonly what: 'role' | 'remove' };

/** Who belongs to the workshop; its owners invite, change and remove. */
export function PeopleScreen({
  initial,
  me,
  manages,
}: {
  initial: People;
  /** Id of the person who looks. */
  me: string;
  manages: boolean;
}) {
  const [open, setOpen] = useState<Open | null>(null);
  const { data } = useQuery({
    queryKey: peopleKey,
    queryFn: fetchPeople,
    initialData: initial,
  });
  const close = () => setOpen(null);
  return (
    <main id="main" className="mx-auto flex w-full max-w-6xl flex-col gap-8 px-5 py-5">
      <div className="flex flex-wrap items-center gap-3">
        <h1 className="wide-letter mr-auto text-title font-semibold">People</h1>
        {manages && (
          <>
            <Link href="/people/mail" className={buttonClass('plain')}>
              Mail sent
            </Link>
            <Button look="action" onPress={() => setOpen('invite')}>
              Invite somebody
            </Button>
          </>
        )}
      </div>
      <MembersTable
        members={data.members}
        me={me}
        {...(manages && {
          onRole: (member: Member) => setOpen({ member, what: 'role' }),
          onRemove: (member: Member) => setOpen({ member, what: 'remove' }),
        })}
      />
      {manages && <InvitationsTable invitations={data.invitations} />}
      <Suspense>
        {open === 'invite' && <InviteDialog onClose={close} />}
        {open !== null && open !== 'invite' && (
          <MemberDialog {...open} isMe={open.member.id === me} onClose={close} />
        )}
      </Suspense>
    </main>
  );
}
