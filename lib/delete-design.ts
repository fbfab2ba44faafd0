import 'server-only';
import { mayEdit, requireMember } from './access';
import { inWorkshop } from './db';
import { lockDesign } from './lock-design';
import { addRecord } from './record';

/** Takes a design out of the workshop's sight; its row and its record stay. */
export async function deleteDesign(id: string): Promise<void> {
  const viewer = await requireMember(mayEdit);
  await inWorkshop(viewer, async (tx) => {
    const stored = await lockDesign(tx, viewer, id);
    stored.deletedAt = new Date();
    addRecord(tx, viewer, {
      what: 'design-deleted',
      subject: id,
      detail: { name: stored.name, version: stored.version },
    });
  });
}
