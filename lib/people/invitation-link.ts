import 'server-only';
import { Invitation } from '@/entities';
import { within } from '../db';
import { RequestError } from '../errors';
import { hashSecret } from '../link-secret';
import type { Role } from '../schemas/api';

/** What an invitation in hand says. */
export interface InvitationInHand {
  readonly email: string;
  readonly role: Role;
  readonly workshopId: string;
  readonly workshopName: string;
  readonly invitedBy: string;
}

const deadWords = {
  unknown: 'This link opens nothing here. Check that all of it was copied from the mail.',
  used: 'This invitation has been used; it opens once. If it was you, sign in.',
  withdrawn:
    'This invitation was withdrawn, or a newer one has taken its place. Look for a newer mail, or ask the owner of the workshop.',
  expired: 'This invitation has expired. Ask the owner of the workshop for another.',
} as const;

/** Says why the link opens nothing, or nothing when it does. */
export function refuseDeadInvitation(
  found: Pick<Invitation, 'usedAt' | 'withdrawnAt' | 'expiresAt'> | null,
): asserts found {
  const state = !found
    ? 'unknown'
    : found.usedAt
      ? 'used'
      : found.withdrawnAt
        ? 'withdrawn'
        : found.expiresAt <= new Date()
          ? 'expired'
          : null;
  if (state) throw new RequestError('not-found', deadWords[state]);
}

/** The invitation that a link's secret opens. @throws RequestError not-found with the reason */
export async function openInvitation(secret: string): Promise<InvitationInHand> {
  const tokenHash = hashSecret(secret);
  const found = await within({ token: tokenHash }, (tx) =>
    tx.findOne(Invitation, { tokenHash }, { populate: ['workshop', 'invitedBy'] }),
  );
  refuseDeadInvitation(found);
  const { email, role, workshop, invitedBy } = found;
  return {
    email,
    role,
    workshopId: workshop.id,
    workshopName: workshop.name,
    invitedBy: invitedBy.name,
  };
}
