import 'server-only';
import { randomUUID } from 'node:crypto';
import { Design, PARAMETERS_FORMAT, User, Workshop } from '@/entities';
import { defaultDesign } from '@/geometry';
import { mayEdit, requireMember } from './access';
import { inWorkshop } from './db';
import { toRecord } from './design-record';
import { badInput } from './errors';
import { assessDesign } from './kernel/kernel';
import { addRecord } from './record';
import { keepVersion } from './revisions/keep-version';
import { createDesignSchema, type DesignRecord } from './schemas/api';

/** Makes a design in the viewer's workshop, from the one given or the kernel's default. */
export async function createDesign(input: unknown): Promise<DesignRecord> {
  const viewer = await requireMember(mayEdit);
  const parsed = createDesignSchema.safeParse(input);
  if (!parsed.success) throw badInput(parsed.error);
  const { name, design = defaultDesign() } = parsed.data;
  const { kernel, checks } = await assessDesign(design);

  return inWorkshop(viewer, async (tx) => {
    const person = await tx.findOneOrFail(User, viewer.userId);
    const stored = tx.create(Design, {
      id: randomUUID(),
      workshop: tx.getReference(Workshop, viewer.workshopId),
      name,
      parameters: design,
      kernel,
      checks,
      version: 1,
      parametersFormat: PARAMETERS_FORMAT,
      createdBy: person,
      updatedBy: person,
      createdAt: new Date(),
      updatedAt: new Date(),
    });
    keepVersion(tx, stored);
    addRecord(tx, viewer, {
      what: 'design-created',
      subject: stored.id,
      detail: { name, kernel, checks },
    });
    await tx.flush();
    return toRecord(tx, stored, viewer);
  });
}
