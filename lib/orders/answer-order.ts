import 'server-only';
import { OrderMessage } from '@/entities';
import { mayOrder, requireMember } from '../access';
import { inWorkshop } from '../db';
import { tellMembers } from '../mail/tell-members';
import { addRecord } from '../record';
import type { Order } from '../schemas/order';
import { addMessage, filesKept } from './add-message';
import { lockOrder, refuseStaleOrder, refuseState } from './lock-order';
import type { GivenMessage } from './message-form';
import { toOrder } from './order-record';

/**
 * Answers the question that an order came back with, and puts it into the queue again.
 * @throws RequestError not-found, bad-input, conflict
 */
export async function answerOrder(id: string, answer: GivenMessage): Promise<Order> {
  const viewer = await requireMember(mayOrder);
  return inWorkshop(viewer, async (tx) => {
    const order = await lockOrder(tx, viewer, id);
    await refuseStaleOrder(tx, viewer, order, answer.version);
    refuseState(order, ['returned'], 'answered');
    const question = await tx.findOne(
      OrderMessage,
      { order: id, kind: 'question' },
      { orderBy: { createdAt: 'desc', id: 'desc' } },
    );
    const waiting = [question?.author.id, order.takenBy?.id];
    const message = await addMessage(tx, viewer, order, answer);
    tx.assign(order, {
      state: 'queued',
      takenBy: null,
      version: order.version + 1,
      updatedAt: new Date(),
    });
    addRecord(tx, viewer, {
      what: 'order-answered',
      subject: id,
      revision: order.revision.id,
      detail: {
        ...{ number: order.number, version: order.version, message },
        files: filesKept(answer.files),
      },
    });
    await tellMembers(tx, viewer, {
      choice: 'answered',
      event: `order-answered:${message}`,
      to: ({ userId }) => waiting.includes(userId),
      subject: `Order ${order.number}: answered, and in the queue again`,
      lines: [`${viewer.name} answered under order ${order.number}:`, answer.text],
      link: { path: `/orders/${id}`, label: `Open order ${order.number}` },
    });
    await tx.flush();
    return toOrder(tx, viewer, order);
  });
}
