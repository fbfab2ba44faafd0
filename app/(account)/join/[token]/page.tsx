import type { Metadata } from 'next';
import { JoinForm } from '@/components/account/join-form';
import { SignOutButton } from '@/components/account/sign-out-button';
import { Notice } from '@/components/ui/notice';
import { findPerson } from '@/lib/account/person';
import { RequestError } from '@/lib/errors';
import { openInvitation } from '@/lib/people/invitation-link';
import { isKnown } from '@/lib/people/join-workshop';

export const metadata: Metadata = { title: 'Join a workshop', robots: { index: false } };

export default async function JoinPage({ params }: { params: Promise<{ token: string }> }) {
  const { token } = await params;
  const invitation = await openInvitation(token).catch((error: unknown) => {
    if (error instanceof RequestError && error.code === 'not-found') return error;
    throw error;
  });
  if (invitation instanceof RequestError) {
    return (
      <>
        <h1 className="text-head">This link does not open</h1>
        <Notice look="warn">{invitation.message}</Notice>
      </>
    );
  }
  const { email, role, workshopName, invitedBy } = invitation;
  const person = await findPerson();
  return (
    <>
      <h1 className="text-head">Join {workshopName}</h1>
      <p>
        {invitedBy} asks {email} into the workshop as {role}.
      </p>
      {person && person.email !== email ? (
        <>
          <Notice look="warn">
            You are signed in as {person.email}. Sign out, then open the link again.
          </Notice>
          <SignOutButton look="plain" />
        </>
      ) : (
        <JoinForm
          secret={token}
          email={email}
          workshop={workshopName}
          comer={person ? 'here' : (await isKnown(invitation)) ? 'known' : 'new'}
        />
      )}
    </>
  );
}
