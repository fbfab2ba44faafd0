'use client';

import { useQuery } from '@tanstack/react-query';
import Link from 'next/link';
import { lazy, Suspense } from 'react';
import { loadOrders } from '@/components/api/load-orders';
import { orderKeys } from '@/components/api/order-keys';
import { Cautions } from '@/components/design/cautions';
import { PanelSection } from '@/components/design/panel-section';
import { Notice } from '@/components/ui/notice';
import type { Order } from '@/lib/schemas/order';
import { useToday } from './due-day';
import { OrderActions } from './order-actions';
import { OrderFacts } from './order-facts';
import { OrderParts, OtherFiles } from './order-files';
import { isOverdue } from './search';
import { StateBadge } from './state-badge';
import { Thread } from './thread';

const KerfOffer = lazy(() => import('./kerf-offer'));
const MessageForm = lazy(() => import('./message-form'));

/** The kerf that was measured, as long as the machine has not been set anew since. */
function kerfToOffer({ actualKerf, cutAt, machine }: Order): number | null {
  if (actualKerf === null || cutAt === null || machine.gone) return null;
  const isNews = actualKerf !== machine.values.kerf && machine.updatedAt < cutAt;
  return isNews ? actualKerf : null;
}

/** One cut order: the files first, then what was asked for and what was written about it. */
export function OrderScreen({ initial }: { initial: Order }) {
  const query = useQuery({
    queryKey: orderKeys.one(initial.id),
    queryFn: async () => (await loadOrders()).fetchOrder(initial.id),
    initialData: initial,
  });
  const order = query.data;
  const { hindrance, revision, cautions } = order;
  const overdue = isOverdue(order, useToday());
  const kerf = kerfToOffer(order);

  return (
    <main id="main" className="mx-auto flex w-full max-w-300 flex-col gap-4 px-5 py-5">
      <p>
        <Link href="/orders" className="inline-flex min-h-11 items-center">
          All cut orders
        </Link>
      </p>
      <div className="flex flex-wrap items-center gap-x-4 gap-y-1">
        <h1 className="wide-letter text-title font-semibold">
          Order {order.number}: {order.quantity} × {revision.designName}, revision{' '}
          {revision.number}
        </h1>
        <StateBadge state={order.state} />
      </div>
      {query.isError && (
        <Notice look="warn">{query.error.message} This order may be out of date.</Notice>
      )}
      {hindrance !== null && (
        <Notice look="bad">
          <strong>Do not cut. </strong>
          {hindrance}
        </Notice>
      )}
      <OrderActions order={order} />
      <Suspense>{kerf !== null && <KerfOffer order={order} kerf={kerf} />}</Suspense>
      <div className="grid gap-6 bench:grid-cols-[minmax(0,1fr)_minmax(0,1fr)]">
        <div className="contents min-w-0 gap-5 bench:flex bench:flex-col">
          <OrderParts order={order} stopped={hindrance !== null} />
          {/* Read at a desk, so on a phone after what is read at the machine. */}
          <div className="flex flex-col gap-5 max-bench:order-last">
            <OtherFiles order={order} stopped={hindrance !== null} />
          </div>
        </div>
        <div className="flex min-w-0 flex-col gap-5">
          <PanelSection title="What was ordered">
            <OrderFacts order={order} overdue={overdue} />
            {order.note && (
              <p className="border-l-4 border-line px-3 wrap-anywhere whitespace-pre-wrap">
                {order.note}
              </p>
            )}
          </PanelSection>
          {cautions.length > 0 && (
            <ul
              aria-label="Cautions"
              className="flex flex-col gap-1.5 border-l-4 border-warn bg-warn-tint px-3 py-2"
            >
              {cautions.map((caution) => (
                <li key={caution}>{caution}</li>
              ))}
            </ul>
          )}
          <PanelSection title="Questions and remarks">
            <Thread messages={order.messages} />
            <Suspense>
              <MessageForm
                // Another purpose is another form.
                key={order.state === 'returned' ? 'answer' : 'remark'}
                order={order}
                kinds={
                  order.state === 'returned' && order.may.order
                    ? ['answer', 'remark']
                    : ['remark']
                }
              />
            </Suspense>
          </PanelSection>
          <Cautions />
        </div>
      </div>
    </main>
  );
}
