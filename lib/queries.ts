import 'server-only';
import { Design } from '@/entities';
import { mayRead, type Viewer } from './access';
import { inWorkshop } from './db';
import { toRecord } from './design-record';
import { idSchema } from './schemas/id';
import type { DesignRecord, DesignSummary } from './schemas/api';

interface SummaryRow {
  id: string;
  name: string;
  status: DesignSummary['status'];
  version: number;
  laws: string[];
  checks: DesignSummary['checks'];
  updatedAt: Date;
  updatedBy: DesignSummary['updatedBy'];
}

/** The workshop's designs, last changed first. Their parameters stay where they are. */
export async function listDesigns(viewer: Viewer): Promise<DesignSummary[]> {
  if (!mayRead(viewer.role)) return [];
  const rows = await inWorkshop(viewer, (tx) =>
    tx.execute<SummaryRow[]>(
      `select d.id, d.name, d.status, d.version, d.checks, d.updated_at as "updatedAt",
          jsonb_path_query_array(d.parameters, '$.sections[*].law') as laws,
          jsonb_build_object('id', u.id, 'name', u.name) as "updatedBy"
        from designs d join users u on u.id = d.updated_by_id
        where d.workshop_id = ? and d.deleted_at is null
        order by d.updated_at desc, d.id`,
      [viewer.workshopId],
    ),
  );
  return rows.map(({ updatedAt, ...row }) => ({
    ...row,
    updatedAt: new Date(updatedAt).toISOString(),
  }));
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
