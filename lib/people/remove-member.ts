import 'server-only';
import { mayManagePeople, requireMember } from '../access';
import { inWorkshop } from '../db';
import { addRecord } from '../record';
import { findMember, lockPeople, refuseLastOwner } from './lock-people';
import { withdrawInvitationsOf } from './withdraw-invitations-of';

/**
 * Ends a membership: from then on this person's sessions open nothing here. The row stays, so that
 * what they did keeps its name; invitations of theirs that are open are withdrawn.
 * @throws RequestError not-found, bad-input for the last owner
 */
export async function removeMember(userId: string): Promise<void> {
  const viewer = await requireMember(mayManagePeople);
  await inWorkshop(viewer, async (tx) => {
    await lockPeople(tx, viewer);
    const member = await findMember(tx, viewer, userId);
    await refuseLastOwner(tx, viewer, member);
    await withdrawInvitationsOf(tx, viewer, userId);
    member.removedAt = new Date();
    addRecord(tx, viewer, {
      what: 'member-removed',
      subject: userId,
      detail: { name: member.user.name, role: member.role },
    });
  });
}
