import type { Loaded } from '@mikro-orm/postgresql';
import type { Revision as StoredRevision } from '@/entities';
import type { Revision } from '../schemas/revision';

/** The people of a revision, to be populated wherever one is shown. */
export const revisionPeople = ['createdBy', 'releasedBy', 'withdrawnBy'] as const;

type Shown = Loaded<StoredRevision, (typeof revisionPeople)[number]>;

const person = (someone: { id: string; name: string } | null | undefined) =>
  someone ? { id: someone.id, name: someone.name } : null;

const moment = (at: Date | null | undefined) => at?.toISOString() ?? null;

/** A revision for a screen, without what is frozen in it. */
export function toRevision(stored: Omit<Shown, 'derivation' | 'parameters'>): Revision {
  const { id, number, name, note, state, version, kernel, checks, waivers } = stored;
  return {
    id,
    designId: stored.design.id,
    designName: stored.designName,
    number,
    name,
    note,
    state,
    version,
    kernel,
    checks,
    waivers,
    createdAt: stored.createdAt.toISOString(),
    createdBy: { id: stored.createdBy.id, name: stored.createdBy.name },
    releasedAt: moment(stored.releasedAt),
    releasedBy: person(stored.releasedBy),
    withdrawnAt: moment(stored.withdrawnAt),
    withdrawnBy: person(stored.withdrawnBy),
    withdrawnReason: stored.withdrawnReason ?? null,
    updatedAt: stored.updatedAt.toISOString(),
  };
}
