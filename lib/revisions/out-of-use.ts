import 'server-only';
import { mayEdit, type Viewer } from '../access';
import { RequestError } from '../errors';
import type { Revision as RevisionRecord } from '../schemas/revision';
import { findReleased } from './queries';

/** @throws RequestError withdrawn, when nobody or not this person may cut from it any more */
export async function refuseOutOfUse(viewer: Viewer, revision: RevisionRecord): Promise<void> {
  const { number, state, designId, withdrawnBy, withdrawnReason } = revision;
  if (state === 'withdrawn') {
    throw new RequestError(
      'withdrawn',
      `Revision ${number} was withdrawn by ${withdrawnBy?.name ?? 'somebody'}: ${withdrawnReason ?? 'no reason is kept'} Do not cut it.`,
    );
  }
  if (state === 'superseded' && !mayEdit(viewer.role)) {
    const now = await findReleased(viewer, designId);
    throw new RequestError(
      'withdrawn',
      `Revision ${number} is superseded${now?.state === 'released' ? `; cut revision ${now.number}` : ''}.`,
    );
  }
}
