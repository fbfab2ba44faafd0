import 'server-only';
import { Design } from '@/entities';
import { mayRead, type Viewer } from './access';
import { inWorkshop } from './db';
import { toRecord, toSummary } from './design-record';
import { idSchema } from './schemas/id';
import type { DesignRecord, DesignSummary } from './schemas/api';

/** The workshop's designs, last changed first. */
export async function listDesigns(viewer: Viewer): Promise<DesignSummary[]> {
  if (!mayRead(viewer.role)) return [];
  const stored = await inWorkshop(viewer, (tx) =>
    tx.find(
      Design,
      { workshop: viewer.workshopId, deletedAt: null },
      { populate: ['updatedBy'], orderBy: { updatedAt: 'desc', id: 'asc' } },
    ),
  );
  return stored.map(toSummary);
}

/** One design of the workshop, or null: another workshop's, deleted, or no id at all. */
export async function findDesign(viewer: Viewer, id: string): Promise<DesignRecord | null> {
  if (!mayRead(viewer.role) || !idSchema.safeParse(id).success) return null;
  const stored = await inWorkshop(viewer, (tx) =>
    tx.findOne(
      Design,
      { id, workshop: viewer.workshopId, deletedAt: null },
      { populate: ['updatedBy'] },
    ),
  );
  return stored && toRecord(stored, viewer);
}
