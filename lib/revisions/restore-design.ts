import 'server-only';
import { DesignVersion, Revision } from '@/entities';
import { checkDesign } from '@/geometry';
import { mayEdit, requireMember, type Viewer } from '../access';
import { inWorkshop } from '../db';
import { toRecord } from '../design-record';
import { badInput, notFound } from '../errors';
import { assessDesign } from '../kernel/kernel';
import { lockDesign, refuseStale } from '../lock-design';
import { putDesign } from '../put-design';
import { findDesign } from '../queries';
import type { DesignRecord } from '../schemas/api';
import { restoreSchema } from '../schemas/revision';

type From = ReturnType<typeof restoreSchema.parse>['from'];

/** Name and parameters of an earlier state of the design. @throws RequestError not-found */
function earlier(viewer: Viewer, designId: string, from: From) {
  return inWorkshop(viewer, async (tx) => {
    if ('version' in from) {
      const kept = await tx.findOne(DesignVersion, { design: designId, version: from.version });
      if (!kept) throw notFound();
      return { name: kept.name, design: checkDesign(kept.parameters), what: from };
    }
    const revision = await tx.findOne(
      Revision,
      { id: from.revision, design: designId },
      { exclude: ['derivation'] },
    );
    if (!revision) throw notFound('revision');
    const { designName, parameters, number } = revision;
    return { name: designName, design: checkDesign(parameters), what: { revision: number } };
  });
}

/**
 * Saves an earlier state of a design as its newest version, to go on from there.
 * @throws RequestError conflict when somebody saved in between
 */
export async function restoreDesign(id: string, input: unknown): Promise<DesignRecord> {
  const viewer = await requireMember(mayEdit);
  const before = await findDesign(viewer, id);
  if (!before) throw notFound();
  const parsed = restoreSchema.safeParse(input);
  if (!parsed.success) throw badInput(parsed.error);
  const { version, from } = parsed.data;
  refuseStale(before, version);
  const { name, design, what } = await earlier(viewer, id, from);
  const assessment = await assessDesign(design);
  return inWorkshop(viewer, async (tx) => {
    const stored = await lockDesign(tx, viewer, id);
    refuseStale(await toRecord(tx, stored, viewer), version);
    const next = { ...assessment, name, design };
    await putDesign(tx, viewer, stored, next, {
      what: 'design-restored',
      detail: { from: what },
    });
    await tx.flush();
    return toRecord(tx, stored, viewer);
  });
}
