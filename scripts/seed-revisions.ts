import type { EntityManager } from '@mikro-orm/postgresql';
import {
  Design,
  Membership,
  RecordEntry,
  User,
  type RecordVerb,
  type Revision,
} from '../entities';
import { deriveDesign } from '../lib/kernel/derive-design';
import { makeFiles } from '../lib/kernel/make-files';
import { addFiles, freeze, revisionNames } from '../lib/revisions/freeze';

const notes: Record<Revision['state'], string> = {
  draft: 'To be looked at before anybody else sees it',
  'in-review': 'Is the gap wide enough for the bench?',
  released: 'First for the bench',
  superseded: '',
  withdrawn: '',
};

/** The states that the demo's designs come to, in the order of their names. */
const states: readonly Revision['state'][] = ['released', 'in-review', 'released', 'draft'];

/** Revisions of a workshop's first designs, on the way that the routes go. */
export async function addRevisions(
  em: EntityManager,
  workshop: { readonly id: string; readonly name: string },
): Promise<void> {
  const designs = await em.find(
    Design,
    { workshop: workshop.id },
    { populate: ['createdBy'], orderBy: { name: 'asc' } },
  );
  const { user: owner } = await em.findOneOrFail(
    Membership,
    { workshop: workshop.id, role: 'owner' },
    { populate: ['user'] },
  );
  for (const [i, state] of states.entries()) {
    const design = designs[i];
    if (design) await addRevision(em, workshop.name, design, owner, state);
  }
}

async function addRevision(
  em: EntityManager,
  workshopName: string,
  design: Design,
  owner: User,
  state: Revision['state'],
): Promise<void> {
  const derivation = deriveDesign(design.parameters);
  if (!derivation.ok) return;
  const builder = design.createdBy as User;
  const at = new Date();
  const named = { number: 1, creator: builder.name, issued: at };
  const names = revisionNames(design, workshopName, named);
  const files = await makeFiles(derivation.derived, names);
  const revision = freeze(em, design, derivation, files, {
    number: 1,
    name: 'First',
    note: notes[state],
    by: builder.id,
    at,
  });
  const record = (what: RecordVerb, who: User): void => {
    em.create(RecordEntry, {
      workshop: design.workshop,
      who,
      what,
      subject: design.id,
      revision: revision.id,
      detail: { number: 1 },
    });
  };
  record('revision-named', builder);
  await em.flush();
  if (state === 'draft') return;
  em.assign(revision, { state: 'in-review', reviewAskedBy: builder });
  record('review-asked', builder);
  await em.flush();
  if (state === 'in-review') return;
  await em.execute('delete from revision_files where revision_id = ?', [revision.id]);
  const final = revisionNames(design, workshopName, named, { by: owner.name, waivers: [] });
  addFiles(em, revision, await makeFiles(derivation.derived, final), at);
  await em.flush();
  em.assign(revision, { state: 'released', releasedBy: owner, releasedAt: at });
  record('revision-released', owner);
  await em.flush();
}
