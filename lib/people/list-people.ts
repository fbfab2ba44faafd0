import 'server-only';
import { Invitation, Membership } from '@/entities';
import { mayManagePeople, mayRead, type Viewer } from '../access';
import { inWorkshop } from '../db';
import type { People } from '../schemas/people';

/** Who belongs to the workshop, by name, and for its owners who is asked to. */
export async function listPeople(viewer: Viewer): Promise<People> {
  if (!mayRead(viewer.role)) return { members: [], invitations: [] };
  return inWorkshop(viewer, async (tx) => {
    const workshop = viewer.workshopId;
    const members = await tx.find(
      Membership,
      { workshop, removedAt: null },
      { populate: ['user'], orderBy: { user: { name: 'asc' }, id: 'asc' } },
    );
    const invitations = mayManagePeople(viewer.role)
      ? await tx.find(
          Invitation,
          { workshop, usedAt: null, withdrawnAt: null },
          { populate: ['invitedBy'], orderBy: { createdAt: 'desc', id: 'asc' } },
        )
      : [];
    return {
      members: members.map(({ user, role, createdAt }) => ({
        id: user.id,
        name: user.name,
        email: user.email,
        role,
        since: createdAt.toISOString(),
      })),
      invitations: invitations.map((one) => ({
        id: one.id,
        email: one.email,
        role: one.role,
        invitedBy: one.invitedBy.name,
        at: one.createdAt.toISOString(),
        expiresAt: one.expiresAt.toISOString(),
        expired: one.expiresAt <= new Date(),
      })),
    };
  });
}
