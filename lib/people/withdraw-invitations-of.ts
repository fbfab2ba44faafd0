import 'server-only';
import type { EntityManager } from '@mikro-orm/postgresql';
import { Invitation } from '@/entities';
import type { Viewer } from '../access';
import { addRecord } from '../record';

/**
 * Ends the open invitations of somebody who may not invite any more: none of them is a way back
 * in. Within `lockPeople`.
 */
export async function withdrawInvitationsOf(
  tx: EntityManager,
  viewer: Viewer,
  userId: string,
): Promise<void> {
  const open = await tx.find(Invitation, {
    workshop: viewer.workshopId,
    invitedBy: userId,
    usedAt: null,
    withdrawnAt: null,
  });
  for (const { id, email, role } of open) {
    // One that is being used at this moment is used.
    const withdrawn = await tx.nativeUpdate(
      Invitation,
      { id, usedAt: null, withdrawnAt: null },
      { withdrawnAt: new Date() },
    );
    if (withdrawn === 0) continue;
    addRecord(tx, viewer, {
      what: 'invitation-withdrawn',
      subject: id,
      detail: { email, role },
    });
  }
}
