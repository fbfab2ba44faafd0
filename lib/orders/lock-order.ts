import 'server-only';
import { LockMode, type EntityManager } from '@mikro-orm/postgresql';
import { CutOrder } from '@/entities';
import type { Viewer } from '../access';
import { notFound, RequestError } from '../errors';
import { idSchema } from '../schemas/id';
import type { OrderState } from '../schemas/order';
import { toOrder } from './order-record';
import { hindranceOf, holdRevision } from './ordered-revision';

/** An order of the workshop, held until the transaction ends. @throws RequestError not-found */
export async function lockOrder(
  tx: EntityManager,
  viewer: Viewer,
  id: string,
): Promise<CutOrder> {
  if (!idSchema.safeParse(id).success) throw notFound('order');
  const order = await tx.findOne(
    CutOrder,
    { id, workshop: viewer.workshopId },
    { lockMode: LockMode.PESSIMISTIC_WRITE },
  );
  if (!order) throw notFound('order');
  return order;
}

/** @throws RequestError conflict with what is stored, when the work began from another version */
export async function refuseStaleOrder(
  tx: EntityManager,
  viewer: Viewer,
  order: CutOrder,
  version: number | undefined,
): Promise<void> {
  if (order.version === version) return;
  if (version === undefined) {
    throw new RequestError('bad-input', 'Version: missing; give the one that you opened.', {
      field: 'version',
    });
  }
  throw new RequestError(
    'conflict',
    `Order ${order.number}: somebody has changed it since you opened it; it is ${order.state} now. Look at it again.`,
    { field: 'version', current: await toOrder(tx, viewer, order) },
  );
}

/** @param done as in `can be cancelled` @throws RequestError bad-input */
export function refuseState(
  { number, state }: CutOrder,
  allowed: readonly OrderState[],
  done: string,
): void {
  if (allowed.includes(state)) return;
  throw new RequestError(
    'bad-input',
    `Order ${number} is ${state}; only one that is ${allowed.join(' or ')} can be ${done}.`,
    { field: 'state' },
  );
}

/**
 * Holds the order's revision as it is until the transaction ends.
 * @throws RequestError bad-input when it must not be cut
 */
export async function refuseHindered(
  tx: EntityManager,
  { workshopId }: Viewer,
  order: CutOrder,
): Promise<void> {
  const revision = await holdRevision(tx, workshopId, order.revision.id);
  const hindrance = revision && hindranceOf(revision);
  if (hindrance) throw new RequestError('bad-input', hindrance, { field: 'revision' });
}
