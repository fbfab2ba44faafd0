import 'server-only';
import { mayEdit, requireMember } from './access';
import { inWorkshop } from './db';
import { toRecord } from './design-record';
import { badInput, notFound } from './errors';
import { assessDesign } from './kernel/kernel';
import { lockDesign, refuseStale } from './lock-design';
import { putDesign } from './put-design';
import { findDesign } from './queries';
import { saveDesignSchema, type DesignRecord } from './schemas/api';

/**
 * Saves a design over the version it began from, and keeps that one. A design that fails its
 * checks may be saved. Saving what is stored already changes nothing.
 * @throws RequestError conflict, with what is stored, when somebody saved in between.
 */
export async function saveDesign(id: string, input: unknown): Promise<DesignRecord> {
  const viewer = await requireMember(mayEdit);
  // Whose design it is comes before what is wrong with the input.
  const before = await findDesign(viewer, id);
  if (!before) throw notFound();
  const parsed = saveDesignSchema.safeParse(input);
  if (!parsed.success) throw badInput(parsed.error);
  const { version, name, design } = parsed.data;
  refuseStale(before, version);
  // Before the row is held: nobody waits for the kernel with a connection in hand.
  const { kernel, checks } = await assessDesign(design);
  return inWorkshop(viewer, async (tx) => {
    const stored = await lockDesign(tx, viewer, id);
    refuseStale(await toRecord(tx, stored, viewer), version);
    const { changed } = await putDesign(
      tx,
      viewer,
      stored,
      { name, design, kernel, checks },
      {
        what: 'design-saved',
      },
    );
    if (changed) await tx.flush();
    return toRecord(tx, stored, viewer);
  });
}
