import 'server-only';
import { User } from '@/entities';
import type { Viewer } from '../access';
import { inWorkshop } from '../db';
import { tellMembers } from '../mail/tell-members';
import { addRecord } from '../record';
import type { Revision, RevisionState } from '../schemas/revision';
import { lockRevision } from './lock-revision';
import { toRevision } from './revision-record';

/** Says that a revision must not be cut any more, and why; everybody hears. @throws RequestError conflict */
export function withdrawRevision(
  viewer: Viewer,
  revision: Revision,
  from: RevisionState,
  reason: string,
): Promise<Revision> {
  const { id, designId, designName, number } = revision;
  return inWorkshop(viewer, async (tx) => {
    const stored = await lockRevision(tx, viewer, revision, from);
    tx.assign(stored, {
      state: 'withdrawn',
      withdrawnBy: await tx.findOneOrFail(User, viewer.userId),
      withdrawnAt: new Date(),
      withdrawnReason: reason,
      updatedAt: new Date(),
    });
    addRecord(tx, viewer, {
      what: 'revision-withdrawn',
      subject: designId,
      revision: id,
      detail: { number, reason },
    });
    await tellMembers(tx, viewer, {
      choice: 'withdrawn',
      event: `revision-withdrawn:${id}`,
      to: () => true,
      subject: `Do not cut: revision ${number} of ${designName} is withdrawn`,
      lines: [
        `${viewer.name} has withdrawn revision ${number} of ${designName}.`,
        `The reason: ${reason}`,
        'Its files can no longer be downloaded. Do not cut from copies of them.',
      ],
      link: { path: `/designs/${designId}`, label: 'See the design' },
    });
    await tx.flush();
    return toRevision(stored);
  });
}
