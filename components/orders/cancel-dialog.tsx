'use client';

import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Notice } from '@/components/ui/notice';
import type { Order } from '@/lib/schemas/order';
import { useOrderChange } from './use-order-change';

export default function CancelDialog({
  order,
  onClose,
}: {
  order: Order;
  onClose: () => void;
}) {
  const cancelling = useOrderChange(order.id, onClose);
  return (
    <Dialog title={`Cancel order ${order.number}?`} role="alertdialog" isOpen onClose={onClose}>
      <p>
        {order.state === 'cutting'
          ? `${order.takenBy?.name ?? 'Somebody'} is cutting it: tell them as well. `
          : ''}
        It stays in the list as cancelled, and cannot be taken up again.
      </p>
      {cancelling.isError && <Notice look="bad">{cancelling.error.message}</Notice>}
      <div className="flex flex-wrap justify-end gap-2">
        <Button onPress={onClose} autoFocus>
          Keep it
        </Button>
        <Button
          look="danger"
          isDisabled={cancelling.isPending}
          onPress={() => cancelling.mutate((calls) => calls.moveOrder(order, 'cancel'))}
        >
          Cancel the order
        </Button>
      </div>
    </Dialog>
  );
}
