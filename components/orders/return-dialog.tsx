'use client';

import { Dialog } from '@/components/ui/dialog';
import type { Order } from '@/lib/schemas/order';
import MessageForm from './message-form';

/** Gives an order back to whoever ordered it, with what has to be known first. */
export default function ReturnDialog({
  order,
  onClose,
}: {
  order: Order;
  onClose: () => void;
}) {
  return (
    <Dialog title={`Return order ${order.number} with a question`} isOpen onClose={onClose}>
      <p>
        It leaves the queue until {order.orderedBy.name} or another builder has answered. A
        photo often says it sooner.
      </p>
      <MessageForm order={order} kinds={['question']} onDone={onClose} onCancel={onClose} />
    </Dialog>
  );
}
