import 'server-only';
import type { EntityManager } from '@mikro-orm/postgresql';
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

/** The highest number that a design's revisions have; 0 when it has none. */
async function lastNumber(tx: EntityManager, design: string): Promise<number> {
  const [last] = await tx.find(
    Revision,
    { design },
    { fields: ['number'], orderBy: { number: 'desc' }, limit: 1 },
  );
  return last?.number ?? 0;
}

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

  // The number stands in the drawing, which is made before the row is held: whoever finds it taken
  // by then makes the drawing anew.
  for (;;) {
    const number = (await inWorkshop(viewer, (tx) => lastNumber(tx, id))) + 1;
    const at = new Date();
    const files = await makeFiles(
      before.design,
      derived,
      revisionNames(before, viewer.workshopName, { number, creator: viewer.name, issued: at }),
    );
    const revision = await inWorkshop(viewer, async (tx) => {
      const stored = await lockDesign(tx, viewer, id);
      refuseStale(await toRecord(tx, stored, viewer), version);
      if ((await lastNumber(tx, id)) + 1 !== number) return null;
      const by = viewer.userId;
      const made = freeze(tx, stored, derivation, files, { number, name, note, by, at });
      addRecord(tx, viewer, {
        what: 'revision-named',
        subject: id,
        revision: made.id,
        detail: { number, name, version, kernel: made.kernel },
      });
      await tx.flush();
      return toRevision(await tx.populate(made, [...revisionPeople]));
    });
    if (revision) return revision;
  }
}
