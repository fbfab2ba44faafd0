import 'server-only';
import { LockMode, type EntityManager, type Loaded } from '@mikro-orm/postgresql';
import { Design, Revision } from '@/entities';
import type { Viewer } from '../access';
import { notFound, RequestError } from '../errors';
import type { Revision as RevisionRecord, RevisionState } from '../schemas/revision';
import { revisionPeople, toRevision } from './revision-record';

export type LockedRevision = Loaded<Revision, (typeof revisionPeople)[number]>;

const words: Record<RevisionState, string> = {
  draft: 'a draft',
  'in-review': 'in review',
  released: 'released',
  superseded: 'superseded',
  withdrawn: 'withdrawn',
};

/** @throws RequestError conflict with what is stored, when it is no longer where the screen saw it. */
export function refuseMoved(current: RevisionRecord, from: RevisionState): void {
  if (current.state === from) return;
  throw new RequestError(
    'conflict',
    `Revision ${current.number}: is ${words[current.state]} by now, not ${words[from]} any more. Look at it again.`,
    { field: 'from', current },
  );
}

/**
 * A revision held until the transaction ends, with its design, so that whatever is done to
 * revisions of one design comes one after the other. @throws RequestError not-found, conflict
 */
export async function lockRevision(
  tx: EntityManager,
  viewer: Viewer,
  { id, designId }: RevisionRecord,
  from: RevisionState,
): Promise<LockedRevision> {
  const lock = { lockMode: LockMode.PESSIMISTIC_WRITE } as const;
  const design = await tx.findOne(
    Design,
    { id: designId, workshop: viewer.workshopId, deletedAt: null },
    lock,
  );
  if (!design) throw notFound('revision');
  const revision = await tx.findOneOrFail(Revision, { id }, lock);
  const whole = await tx.populate(revision, [...revisionPeople]);
  refuseMoved(toRevision(whole), from);
  return whole;
}
