'use client';

import { lazy, Suspense, useState } from 'react';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import type { Order } from '@/lib/schemas/order';
import { isOpen } from './search';
import { useOrderChange } from './use-order-change';

const OrderDialog = lazy(() => import('./order-dialog'));
const dialogs = {
  return: lazy(() => import('./return-dialog')),
  finish: lazy(() => import('./finish-dialog')),
  cancel: lazy(() => import('./cancel-dialog')),
  change: OrderDialog,
};

/** What this person can do with the order as it stands. */
export function OrderActions({ order }: { order: Order }) {
  const [open, setOpen] = useState<keyof typeof dialogs | 'again' | null>(null);
  const beginning = useOrderChange(order.id, () => undefined);
  const { state, may, hindrance, successor } = order;
  const Dialog = open && open !== 'again' && dialogs[open];
  const close = () => setOpen(null);
  const still = hindrance === null;
  const inHand = state === 'queued' || state === 'cutting';
  return (
    <>
      <div className="flex flex-wrap gap-2">
        {may.cut && still && state === 'queued' && (
          <Button
            look="action"
            isDisabled={beginning.isPending}
            onPress={() => beginning.mutate((calls) => calls.moveOrder(order, 'begin'))}
          >
            Begin cutting
          </Button>
        )}
        {may.cut && still && state === 'cutting' && (
          <Button look="action" onPress={() => setOpen('finish')}>
            It is cut
          </Button>
        )}
        {may.cut && inHand && (
          <Button onPress={() => setOpen('return')}>Return with a question</Button>
        )}
        {may.order && still && (state === 'queued' || state === 'returned') && (
          <Button onPress={() => setOpen('change')}>Change the order</Button>
        )}
        {may.order && successor && (!still || state === 'cancelled') && (
          <Button onPress={() => setOpen('again')}>
            Order revision {successor.number} instead
          </Button>
        )}
        {may.order && isOpen(order) && (
          <Button look="danger" onPress={() => setOpen('cancel')}>
            Cancel the order
          </Button>
        )}
      </div>
      {beginning.isError && <Notice look="bad">{beginning.error.message}</Notice>}
      <Suspense>
        {Dialog && <Dialog order={order} onClose={close} />}
        {open === 'again' && successor && (
          <OrderDialog revision={successor.id} like={order} onClose={close} />
        )}
      </Suspense>
    </>
  );
}
