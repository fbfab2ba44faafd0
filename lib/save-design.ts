import 'server-only';
import { User } from '@/entities';
import { mayEdit, requireMember } from './access';
import { changesBetween } from './changes';
import { inWorkshop } from './db';
import { readParameters, toRecord } from './design-record';
import { badInput, notFound } from './errors';
import { assessDesign } from './kernel/kernel';
import { lockDesign, refuseStale } from './lock-design';
import { findDesign } from './queries';
import { addRecord } from './record';
import { saveDesignSchema, type DesignRecord } from './schemas/api';

/**
 * Saves a design over the version it began from. A design that fails its checks may be saved;
 * any change makes it a draft again. Saving what is stored already changes nothing.
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
    refuseStale(toRecord(stored, viewer), version);
    const changes = changesBetween(
      { name: stored.name, design: readParameters(stored) },
      { name, design },
    );
    if (changes.length === 0 && stored.kernel === kernel) return toRecord(stored, viewer);

    tx.assign(stored, {
      name,
      parameters: design,
      kernel,
      checks,
      status: 'draft',
      version: stored.version + 1,
      updatedBy: await tx.findOneOrFail(User, viewer.userId),
      updatedAt: new Date(),
    });
    addRecord(tx, viewer, {
      what: 'design-saved',
      subject: id,
      detail: { version: stored.version, kernel, checks, changes },
    });
    await tx.flush();
    return toRecord(stored, viewer);
  });
}
