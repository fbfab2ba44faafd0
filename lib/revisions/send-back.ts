import 'server-only';
import type { Viewer } from '../access';
import { inWorkshop } from '../db';
import { addRecord } from '../record';
import type { Revision, RevisionState } from '../schemas/revision';
import { lockRevision } from './lock-revision';
import { toRevision } from './revision-record';

/** Takes a revision out of review, with the reason. @throws RequestError conflict */
export function sendBack(
  viewer: Viewer,
  revision: Revision,
  from: RevisionState,
  reason: string,
): Promise<Revision> {
  return inWorkshop(viewer, async (tx) => {
    const stored = await lockRevision(tx, viewer, revision, from);
    tx.assign(stored, { state: 'draft', updatedAt: new Date() });
    addRecord(tx, viewer, {
      what: 'review-refused',
      subject: revision.designId,
      revision: revision.id,
      detail: { number: revision.number, reason },
    });
    await tx.flush();
    return toRevision(stored);
  });
}
