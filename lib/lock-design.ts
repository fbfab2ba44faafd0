import 'server-only';
import { LockMode, type EntityManager, type Loaded } from '@mikro-orm/postgresql';
import { Design } from '@/entities';
import type { Viewer } from './access';
import { notFound, RequestError } from './errors';
import type { DesignRecord } from './schemas/api';
import { idSchema } from './schemas/id';

type LockedDesign = Loaded<Design, 'updatedBy'>;

/**
 * The design, if it is the viewer's workshop's, held until the transaction ends, so that two
 * writers come one after the other. @throws RequestError not-found.
 */
export async function lockDesign(
  tx: EntityManager,
  viewer: Viewer,
  id: string,
): Promise<LockedDesign> {
  if (!idSchema.safeParse(id).success) throw notFound();
  const design = await tx.findOne(
    Design,
    { id, workshop: viewer.workshopId, deletedAt: null },
    { lockMode: LockMode.PESSIMISTIC_WRITE },
  );
  if (!design) throw notFound();
  return tx.populate(design, ['updatedBy']);
}

/** @throws RequestError conflict with what is stored, when the work began from another version. */
export function refuseStale(current: DesignRecord, version: number): void {
  if (current.version === version) return;
  throw new RequestError(
    'conflict',
    `Version: this began from ${version}, but ${current.updatedBy.name} has saved version ${current.version} since; take theirs or save yours over it.`,
    { field: 'version', current },
  );
}
