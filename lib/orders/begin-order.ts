import 'server-only';
import { User } from '@/entities';
import { mayCut, requireMember } from '../access';
import { inWorkshop } from '../db';
import { badInput } from '../errors';
import { addRecord } from '../record';
import { moveOrderSchema, type Order } from '../schemas/order';
import { lockOrder, refuseHindered, refuseStaleOrder, refuseState } from './lock-order';
import { toOrder } from './order-record';

/** Takes an order out of the queue to cut it. @throws RequestError not-found, bad-input, conflict */
export async function beginOrder(id: string, input: unknown): Promise<Order> {
  const viewer = await requireMember(mayCut);
  return inWorkshop(viewer, async (tx) => {
    const order = await lockOrder(tx, viewer, id);
    const parsed = moveOrderSchema.safeParse(input);
    if (!parsed.success) throw badInput(parsed.error);
    await refuseStaleOrder(tx, viewer, order, parsed.data.version);
    refuseState(order, ['queued'], 'begun');
    await refuseHindered(tx, viewer, order);
    tx.assign(order, {
      state: 'cutting',
      takenBy: tx.getReference(User, viewer.userId),
      version: order.version + 1,
      updatedAt: new Date(),
    });
    addRecord(tx, viewer, {
      what: 'order-begun',
      subject: id,
      revision: order.revision.id,
      detail: { number: order.number, version: order.version },
    });
    await tx.flush();
    return toOrder(tx, viewer, order);
  });
}
