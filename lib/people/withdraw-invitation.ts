import 'server-only';
import { LockMode } from '@mikro-orm/postgresql';
import { Invitation } from '@/entities';
import { mayManagePeople, requireMember } from '../access';
import { inWorkshop } from '../db';
import { RequestError } from '../errors';
import { addRecord } from '../record';
import { idSchema } from '../schemas/id';

/** Ends an invitation that nobody has used. @throws RequestError not-found */
export async function withdrawInvitation(id: string): Promise<void> {
  const viewer = await requireMember(mayManagePeople);
  await inWorkshop(viewer, async (tx) => {
    const invitation =
      idSchema.safeParse(id).success &&
      (await tx.findOne(
        Invitation,
        { id, workshop: viewer.workshopId, usedAt: null, withdrawnAt: null },
        { lockMode: LockMode.PESSIMISTIC_WRITE },
      ));
    if (!invitation) {
      throw new RequestError(
        'not-found',
        'No such invitation in your workshop; it may have been used or withdrawn.',
      );
    }
    invitation.withdrawnAt = new Date();
    addRecord(tx, viewer, {
      what: 'invitation-withdrawn',
      subject: id,
      detail: { email: invitation.email, role: invitation.role },
    });
  });
}
