/** Revisions as they are once released, put there along the only way that the database allows. */

import { createHash, randomUUID } from 'node:crypto';
import { Design, Revision, RevisionFile, User, Workshop } from '@/entities';
import { defaultDesign, derive, type Derived } from '@/geometry';
import { cutFiles } from '@/geometry/files';
import { entityManager } from './as-owner';
import type { Cast } from './cast';

let derived: Derived | undefined;

/** The default design's plates, derived once for all revisions of a test file. */
function plates(): Derived {
  if (derived) return derived;
  const derivation = derive(defaultDesign());
  if (!derivation.ok) throw new Error('the default design has no plates');
  return (derived = derivation.derived);
}

export type RevisionState = Revision['state'];

/** The states that a revision goes through on its way. */
const ways: Record<RevisionState, readonly RevisionState[]> = {
  draft: [],
  'in-review': ['in-review'],
  released: ['in-review', 'released'],
  superseded: ['in-review', 'released', 'superseded'],
  withdrawn: ['in-review', 'released', 'withdrawn'],
};

/** Moves a revision on to a state, as its owner would. */
export async function moveRevision(
  id: string,
  states: readonly RevisionState[],
): Promise<void> {
  const em = await entityManager();
  for (const state of states) {
    await em.execute(
      `update revisions set state = ?, updated_at = now(),
        released_at = coalesce(released_at, case when ? = 'released' then now() end),
        withdrawn_reason = case when ? = 'withdrawn' then 'hole too small' end
        where id = ?`,
      [state, state, state, id],
    );
  }
}

/** A revision of a design of ours, with its files. Resolves to its id. */
export async function revisionOf(
  cast: Cast,
  design: string,
  number: number,
  state: RevisionState = 'released',
): Promise<string> {
  const em = await entityManager();
  const id = randomUUID();
  const workshop = em.getReference(Workshop, cast.workshopId);
  const now = new Date();
  const { name, parameters } = await em.findOneOrFail(Design, design);
  const revision = em.create(Revision, {
    id,
    workshop,
    design: em.getReference(Design, design),
    number,
    name: `Number ${number}`,
    note: '',
    designName: name,
    version: 1,
    parameters,
    parametersFormat: 1,
    kernel: plates().kernel,
    checks: { ok: 1, warn: 0, fail: 0 },
    derivation: { ok: true, derived: plates() },
    state: 'draft',
    createdBy: em.getReference(User, cast.person('builder').id),
    createdAt: now,
    updatedAt: now,
  });
  cutFiles(name, plates()).forEach(({ text, ...file }, position) => {
    const body = Buffer.from(text, 'utf8');
    const sha256 = createHash('sha256').update(body).digest('hex');
    const bytes = body.byteLength;
    em.create(RevisionFile, { ...file, workshop, revision, position, bytes, sha256, body });
  });
  await em.flush();
  await moveRevision(id, ways[state]);
  return id;
}
