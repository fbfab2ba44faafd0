import 'server-only';
import { mayOrder, requireMember } from '../access';
import { inWorkshop } from '../db';
import { badInput } from '../errors';
import { addRecord } from '../record';
import { moveOrderSchema, type Order } from '../schemas/order';
import { lockOrder, refuseStaleOrder, refuseState } from './lock-order';
import { toOrder } from './order-record';

/** Calls an order off, as long as it is not cut. @throws RequestError not-found, bad-input, conflict */
export async function cancelOrder(id: string, input: unknown): Promise<Order> {
  const viewer = await requireMember(mayOrder);
  return inWorkshop(viewer, async (tx) => {
    const order = await lockOrder(tx, viewer, id);
    const parsed = moveOrderSchema.safeParse(input);
    if (!parsed.success) throw badInput(parsed.error);
    await refuseStaleOrder(tx, viewer, order, parsed.data.version);
    refuseState(order, ['queued', 'cutting', 'returned'], 'cancelled');
    const from = order.state;
    tx.assign(order, {
      state: 'cancelled',
      version: order.version + 1,
      updatedAt: new Date(),
    });
    addRecord(tx, viewer, {
      what: 'order-cancelled',
      subject: id,
      revision: order.revision.id,
      detail: { number: order.number, version: order.version, from },
    });
    await tx.flush();
    return toOrder(tx, viewer, order);
  });
}
