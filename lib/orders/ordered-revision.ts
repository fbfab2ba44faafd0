import 'server-only';
import type { EntityManager } from '@mikro-orm/postgresql';
import type { OrderedRevision } from '../schemas/order';

export interface StoredRevision extends OrderedRevision {
  readonly withdrawnReason: string | null;
  /** The design's released revision, if any. */
  readonly released: { readonly id: string; readonly number: number } | null;
}

const COLUMNS = `r.id, r.design_id as "designId", r.design_name as "designName", r.number,
  r.name, r.state, r.withdrawn_reason as "withdrawnReason",
  (select json_build_object('id', o.id, 'number', o.number) from revisions o
    where o.design_id = r.design_id and o.state = 'released') as released`;

/** Without what the kernel said, which is long. */
export async function orderedRevisions(
  tx: EntityManager,
  ids: readonly string[],
): Promise<Map<string, StoredRevision>> {
  const rows = await tx.execute<StoredRevision[]>(
    `select ${COLUMNS} from revisions r where r.id = any(?::uuid[])`,
    [`{${[...new Set(ids)].join(',')}}`],
  );
  return new Map(rows.map((row) => [row.id, row]));
}

/** Every revision of the workshop that may be ordered. */
export function releasedRevisions(
  tx: EntityManager,
  workshopId: string,
): Promise<StoredRevision[]> {
  return tx.execute<StoredRevision[]>(
    `select ${COLUMNS} from revisions r
      where r.workshop_id = ? and r.state = 'released' order by r.design_name, r.number`,
    [workshopId],
  );
}

/**
 * One revision of the workshop, which nobody withdraws or supersedes until the transaction ends;
 * null where there is none.
 */
export async function holdRevision(
  tx: EntityManager,
  workshopId: string,
  id: string,
): Promise<StoredRevision | null> {
  const held = await tx.execute(
    'select 1 from revisions where id = ? and workshop_id = ? for share',
    [id, workshopId],
  );
  // Read after the wait, as it stands now.
  return held.length === 0 ? null : ((await orderedRevisions(tx, [id])).get(id) ?? null);
}

/** Why a revision must not be cut; null when it may. */
export function hindranceOf(revision: StoredRevision): string | null {
  const { state, number, withdrawnReason, released } = revision;
  const instead = released
    ? `order revision ${released.number} instead`
    : 'order another revision once one is released';
  if (state === 'released') return null;
  if (state === 'withdrawn') {
    const why = withdrawnReason ? ` (${withdrawnReason.replace(/[.\s]+$/, '')})` : '';
    return `Revision ${number} was withdrawn${why} and must not be cut; cancel this order and ${instead}.`;
  }
  if (state === 'superseded') {
    const by = released ? ` by revision ${released.number}` : '';
    return `Revision ${number} was superseded${by} and is no longer the one to cut; cancel this order and ${instead}.`;
  }
  return `Revision ${number} is not released; only a released one may be cut.`;
}
