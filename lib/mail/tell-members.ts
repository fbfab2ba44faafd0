import 'server-only';
import type { EntityManager } from '@mikro-orm/postgresql';
import { Membership, type MailChoice } from '@/entities';
import type { Viewer } from '../access';
import type { Role } from '../schemas/api';
import { addMail } from './add-mail';
import type { Letter } from './letter';

interface Told extends Letter {
  /** What a member may have muted. */
  readonly choice: MailChoice;
  /** Names what happened, once for good, as `revision-released:<id>`. */
  readonly event: string;
  readonly to: (member: { userId: string; role: Role }) => boolean;
}

/**
 * One mail to each member of the viewer's workshop for whom `to` is true, who wants mail of that
 * kind, and who is not the viewer; in the transaction of what it tells of.
 */
export async function tellMembers(
  tx: EntityManager,
  viewer: Viewer,
  { choice, event, to, subject, lines, link }: Told,
): Promise<void> {
  const members = await tx.find(
    Membership,
    { workshop: viewer.workshopId, removedAt: null, user: { $ne: viewer.userId } },
    { populate: ['user'] },
  );
  for (const { user, role, mutedMail } of members) {
    if (mutedMail.includes(choice) || !to({ userId: user.id, role })) continue;
    addMail(tx, {
      workshopId: viewer.workshopId,
      kind: choice,
      event,
      to: user.email,
      letter: { subject, lines, link },
    });
  }
}
