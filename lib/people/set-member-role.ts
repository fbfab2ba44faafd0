import 'server-only';
import { mayManagePeople, requireMember } from '../access';
import { inWorkshop } from '../db';
import { badInput } from '../errors';
import { addRecord } from '../record';
import { setRoleSchema } from '../schemas/people';
import { findMember, lockPeople, refuseLastOwner } from './lock-people';
import { withdrawInvitationsOf } from './withdraw-invitations-of';

/** Gives a member another role. @throws RequestError not-found, bad-input for the last owner */
export async function setMemberRole(userId: string, input: unknown): Promise<void> {
  const viewer = await requireMember(mayManagePeople);
  const parsed = setRoleSchema.safeParse(input);
  await inWorkshop(viewer, async (tx) => {
    await lockPeople(tx, viewer);
    const member = await findMember(tx, viewer, userId);
    if (!parsed.success) throw badInput(parsed.error);
    const { role } = parsed.data;
    if (member.role === role) return;
    await refuseLastOwner(tx, viewer, member);
    if (!mayManagePeople(role)) await withdrawInvitationsOf(tx, viewer, userId);
    const from = member.role;
    member.role = role;
    addRecord(tx, viewer, {
      what: 'member-role-set',
      subject: userId,
      detail: { name: member.user.name, from, to: role },
    });
  });
}
