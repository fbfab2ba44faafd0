import 'server-only';
import { Revision } from '@/entities';
import { mayEdit, requireMember } from '../access';
import { inWorkshop } from '../db';
import { toRecord } from '../design-record';
import { badInput, notFound } from '../errors';
import { deriveDesign, derivePlates, makeFiles } from '../kernel/kernel';
import { lockDesign, refuseStale } from '../lock-design';
import { findDesign } from '../queries';
import { addRecord } from '../record';
import { nameRevisionSchema, type Revision as RevisionRecord } from '../schemas/revision';
import { freeze, revisionNames } from './freeze';
import { revisionPeople, toRevision } from './revision-record';

/**
 * Freezes a design as it is saved under a name and the next number.
 * @throws RequestError conflict when it was saved since, checks-fail when it has no plates
 */
export async function nameRevision(id: string, input: unknown): Promise<RevisionRecord> {
  const viewer = await requireMember(mayEdit);
  const before = await findDesign(viewer, id);
  if (!before) throw notFound();
  const parsed = nameRevisionSchema.safeParse(input);
  if (!parsed.success) throw badInput(parsed.error);
  const { version, name, note } = parsed.data;
  refuseStale(before, version);
  const derived = await derivePlates(before.design);
  const derivation = await deriveDesign(before.design);

  return inWorkshop(viewer, async (tx) => {
    const stored = await lockDesign(tx, viewer, id);
    refuseStale(await toRecord(tx, stored, viewer), version);
    const [last] = await tx.find(
      Revision,
      { design: id },
      { fields: ['number'], orderBy: { number: 'desc' }, limit: 1 },
    );
    const number = (last?.number ?? 0) + 1;
    const at = new Date();
    // With the row held, since the number stands in the drawing; naming is rare.
    const names = revisionNames(stored, viewer.workshopName, {
      number,
      creator: viewer.name,
      issued: at,
    });
    const files = await makeFiles(before.design, derived, names);
    const by = viewer.userId;
    const revision = freeze(tx, stored, derivation, files, { number, name, note, by, at });
    addRecord(tx, viewer, {
      what: 'revision-named',
      subject: id,
      revision: revision.id,
      detail: { number, name, version, kernel: revision.kernel },
    });
    await tx.flush();
    return toRevision(await tx.populate(revision, [...revisionPeople]));
  });
}
