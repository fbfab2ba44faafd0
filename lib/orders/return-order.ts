import 'server-only';
import { mayCut, requireMember } from '../access';
import { inWorkshop } from '../db';
import { tellMembers } from '../mail/tell-members';
import { addRecord } from '../record';
import type { Order } from '../schemas/order';
import { addMessage, filesKept } from './add-message';
import { lockOrder, refuseStaleOrder, refuseState } from './lock-order';
import type { GivenMessage } from './message-form';
import { toOrder } from './order-record';

/**
 * Gives an order back to whoever ordered it, with a question.
 * @throws RequestError not-found, bad-input, conflict
 */
export async function returnOrder(id: string, question: GivenMessage): Promise<Order> {
  const viewer = await requireMember(mayCut);
  return inWorkshop(viewer, async (tx) => {
    const order = await lockOrder(tx, viewer, id);
    await refuseStaleOrder(tx, viewer, order, question.version);
    refuseState(order, ['queued', 'cutting'], 'returned');
    const from = order.state;
    const message = await addMessage(tx, viewer, order, question);
    tx.assign(order, {
      state: 'returned',
      version: order.version + 1,
      updatedAt: new Date(),
    });
    addRecord(tx, viewer, {
      what: 'order-returned',
      subject: id,
      revision: order.revision.id,
      detail: {
        ...{ number: order.number, version: order.version, from, message },
        files: filesKept(question.files),
      },
    });
    const orderedBy = order.orderedBy.id;
    await tellMembers(tx, viewer, {
      choice: 'asked',
      event: `order-asked:${message}`,
      to: ({ userId }) => userId === orderedBy,
      subject: `Order ${order.number}: a question`,
      lines: [
        `${viewer.name} returned order ${order.number} with a question:`,
        question.text,
        ...(question.files.length > 0 ? ['Files are with it, to see on its page.'] : []),
      ],
      link: { path: `/orders/${id}`, label: `Answer under order ${order.number}` },
    });
    await tx.flush();
    return toOrder(tx, viewer, order);
  });
}
