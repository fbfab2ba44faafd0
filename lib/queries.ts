import 'server-only';
import type { EntityManager } from '@mikro-orm/postgresql';
import { Design } from '@/entities';
import { mayEdit, mayRead, type Viewer } from './access';
import { inWorkshop } from './db';
import { toRecord } from './design-record';
import { designState, revisionsOf } from './revisions/design-state';
import { idSchema } from './schemas/id';
import type { DesignRecord, DesignState, DesignSummary } from './schemas/api';

interface Row extends Omit<DesignSummary, 'state' | 'updatedAt'> {
  readonly updatedAt: Date;
}

const ofDate = ({ updatedAt, ...row }: Row) => ({
  ...row,
  updatedAt: new Date(updatedAt).toISOString(),
});

async function savedDesigns(tx: EntityManager, workshopId: string): Promise<DesignSummary[]> {
  const rows = await tx.execute<Row[]>(
    `select d.id, d.name, d.version, d.checks, d.updated_at as "updatedAt",
        jsonb_path_query_array(d.parameters, '$.sections[*].law') as laws,
        jsonb_build_object('id', u.id, 'name', u.name) as "updatedBy"
      from designs d join users u on u.id = d.updated_by_id
      where d.workshop_id = ? and d.deleted_at is null
      order by d.updated_at desc, d.id`,
    [workshopId],
  );
  const revisions = await revisionsOf(
    tx,
    rows.map(({ id }) => id),
  );
  return rows.map((row) => ({
    ...ofDate(row),
    state: designState(row.version, revisions.get(row.id) ?? []),
  }));
}

/** What has been released of each design, and the last of it where nothing is released now. */
async function releasedDesigns(
  tx: EntityManager,
  workshopId: string,
): Promise<DesignSummary[]> {
  const rows = await tx.execute<(Row & { number: number; kind: DesignState['kind'] })[]>(
    `select * from (
      select distinct on (d.id) d.id, r.design_name as name, r.version, r.checks, r.number,
          case r.state when 'released' then 'released' else 'withdrawn' end as kind,
          r.updated_at as "updatedAt",
          jsonb_path_query_array(r.parameters, '$.sections[*].law') as laws,
          jsonb_build_object('id', u.id, 'name', u.name) as "updatedBy"
        from designs d
        join revisions r on r.design_id = d.id
          and r.state in ('released', 'superseded', 'withdrawn')
        join users u on u.id = coalesce(r.withdrawn_by_id, r.released_by_id, r.created_by_id)
        where d.workshop_id = ? and d.deleted_at is null
        order by d.id, r.state = 'released' desc, r.released_at desc, r.number desc) latest
      order by "updatedAt" desc, id`,
    [workshopId],
  );
  return rows.map(({ number, kind, ...row }) => ({
    ...ofDate(row),
    state: { kind, revision: number },
  }));
}

/** The workshop's designs, last changed first: what is saved for those who may edit, else what is released. */
export async function listDesigns(viewer: Viewer): Promise<DesignSummary[]> {
  if (!mayRead(viewer.role)) return [];
  const list = mayEdit(viewer.role) ? savedDesigns : releasedDesigns;
  return inWorkshop(viewer, (tx) => list(tx, viewer.workshopId));
}

/**
 * One design of the workshop as it is saved, or null: another workshop's, deleted, no id at all, or
 * asked for by somebody who sees only what is released.
 */
export async function findDesign(viewer: Viewer, id: string): Promise<DesignRecord | null> {
  if (!mayEdit(viewer.role) || !idSchema.safeParse(id).success) return null;
  return inWorkshop(viewer, async (tx) => {
    const stored = await tx.findOne(
      Design,
      { id, workshop: viewer.workshopId, deletedAt: null },
      { populate: ['updatedBy'] },
    );
    return stored && toRecord(tx, stored, viewer);
  });
}
