import type { EntityManager } from '@mikro-orm/postgresql';
import type { Revision } from '@/entities';
import type { DesignState } from '../schemas/api';

type Known = Pick<Revision, 'number' | 'state' | 'version'>;

/** What a design's revisions say of it. @param version the one that is saved */
export function designState(version: number, revisions: readonly Known[]): DesignState {
  // A superseded one says nothing by itself: the one that took its place does, whatever its number.
  const latest = revisions
    .filter(({ state }) => state !== 'superseded')
    .sort((a, b) => b.number - a.number)[0];
  const inReview = revisions
    .filter(({ state }) => state === 'in-review')
    .sort((a, b) => b.number - a.number)[0];
  // Somebody waits for it, whatever has been named on top of it.
  if (inReview) return { kind: 'in-review', revision: inReview.number };
  const released = revisions.find(({ state }) => state === 'released');
  if (released) {
    const kind = version > released.version ? 'changed' : 'released';
    return { kind, revision: released.number };
  }
  const withdrawn = latest?.state === 'withdrawn';
  return withdrawn
    ? { kind: 'withdrawn', revision: latest.number }
    : { kind: 'draft', revision: null };
}

/** The revisions of designs, by design, without what is in them. */
export async function revisionsOf(
  tx: EntityManager,
  designs: readonly string[],
): Promise<Map<string, Known[]>> {
  const rows = await tx.execute<(Known & { design: string })[]>(
    `select design_id as design, number, state, version from revisions
      where design_id = any(?::uuid[])`,
    [`{${designs.join(',')}}`],
  );
  const found = new Map<string, Known[]>(designs.map((id) => [id, []]));
  for (const { design, ...known } of rows) found.get(design)?.push(known);
  return found;
}
