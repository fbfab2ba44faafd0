import 'server-only';
import { User } from '@/entities';
import type { Viewer } from '../access';
import { inWorkshop } from '../db';
import { addRecord } from '../record';
import type { Revision, RevisionState } from '../schemas/revision';
import { lockRevision } from './lock-revision';
import { toRevision } from './revision-record';

/** Says that a draft is ready for somebody else's eyes. @throws RequestError conflict */
export function askForReview(
  viewer: Viewer,
  revision: Revision,
  from: RevisionState,
): Promise<Revision> {
  return inWorkshop(viewer, async (tx) => {
    const stored = await lockRevision(tx, viewer, revision, from);
    tx.assign(stored, {
      state: 'in-review',
      reviewAskedBy: tx.getReference(User, viewer.userId),
      updatedAt: new Date(),
    });
    addRecord(tx, viewer, {
      what: 'review-asked',
      subject: revision.designId,
      revision: revision.id,
      detail: { number: revision.number },
    });
    await tx.flush();
    return toRevision(stored);
  });
}
