import 'server-only';
import { LockMode, type EntityManager } from '@mikro-orm/postgresql';
import { Revision } from '@/entities';
import { mayEdit, type Viewer } from '../access';
import { RequestError } from '../errors';
import type { Revision as RevisionRecord } from '../schemas/revision';
import { revisionPeople, toRevision } from './revision-record';

/** @throws RequestError withdrawn, when nobody or not this person may cut from it any more */
export async function refuseOutOfUse(
  tx: EntityManager,
  viewer: Viewer,
  revision: RevisionRecord,
): Promise<void> {
  const { number, state, designId, withdrawnBy, withdrawnReason } = revision;
  if (state === 'withdrawn') {
    throw new RequestError(
      'withdrawn',
      `Revision ${number} was withdrawn by ${withdrawnBy?.name ?? 'somebody'}: ${withdrawnReason ?? 'no reason is kept'} Do not cut it.`,
    );
  }
  if (state === 'superseded' && !mayEdit(viewer.role)) {
    const now = await tx.findOne(
      Revision,
      { design: designId, state: 'released' },
      { fields: ['number'] },
    );
    throw new RequestError(
      'withdrawn',
      `Revision ${number} is superseded${now ? `; cut revision ${now.number}` : ''}.`,
    );
  }
}

/**
 * Looks again in the transaction that gives out what was made of a revision, and keeps it where it
 * is until that is recorded: nothing goes out after a withdrawal. @throws RequestError withdrawn
 */
export async function holdInUse(
  tx: EntityManager,
  viewer: Viewer,
  id: string,
): Promise<RevisionRecord> {
  const stored = await tx.findOneOrFail(
    Revision,
    { id },
    { exclude: ['derivation', 'parameters'], lockMode: LockMode.PESSIMISTIC_READ },
  );
  const revision = toRevision(await tx.populate(stored, [...revisionPeople]));
  await refuseOutOfUse(tx, viewer, revision);
  return revision;
}
