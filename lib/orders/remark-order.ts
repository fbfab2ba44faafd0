import 'server-only';
import { mayRead, requireMember } from '../access';
import { inWorkshop } from '../db';
import { addRecord } from '../record';
import type { Order } from '../schemas/order';
import { addMessage, filesKept } from './add-message';
import { lockOrder } from './lock-order';
import type { GivenMessage } from './message-form';
import { toOrder } from './order-record';

/** Writes under an order, whatever its state. @throws RequestError not-found, bad-input */
export async function remarkOrder(id: string, remark: GivenMessage): Promise<Order> {
  const viewer = await requireMember(mayRead);
  return inWorkshop(viewer, async (tx) => {
    const order = await lockOrder(tx, viewer, id);
    const message = await addMessage(tx, viewer, order, remark);
    addRecord(tx, viewer, {
      what: 'order-remarked',
      subject: id,
      revision: order.revision.id,
      detail: { number: order.number, message, files: filesKept(remark.files) },
    });
    await tx.flush();
    return toOrder(tx, viewer, order);
  });
}
