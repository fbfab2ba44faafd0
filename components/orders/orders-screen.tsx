'use client';

import { useQuery } from '@tanstack/react-query';
import { lazy, Suspense, useState } from 'react';
import { loadOrders } from '@/components/api/load-orders';
import { orderKeys } from '@/components/api/order-keys';
import { Button } from '@/components/ui/button';
import { CheckField } from '@/components/ui/check-field';
import { Notice } from '@/components/ui/notice';
import { SearchField } from '@/components/ui/search-field';
import { SelectField } from '@/components/ui/select-field';
import type { OrderSummary } from '@/lib/schemas/order';
import { TodayWords, useToday } from './due-day';
import { OrdersTable } from './orders-table';
import { found, isOverdue, stateOptions, type Asked } from './search';

const OrderDialog = lazy(() => import('./order-dialog'));

/** What is to be cut, soonest first; others' changes appear while one looks. */
export function OrdersScreen({
  initial,
  me,
  mayOrder,
}: {
  initial: OrderSummary[];
  /** Id of the person who looks. */
  me: string;
  mayOrder: boolean;
}) {
  const query = useQuery({
    queryKey: orderKeys.list,
    queryFn: async () => (await loadOrders()).fetchOrders(),
    initialData: initial,
  });
  const orders = query.data;
  const today = useToday();
  const [ordering, setOrdering] = useState(false);
  const [asked, setAsked] = useState<Asked>({
    words: '',
    state: 'open',
    mine: false,
    overdue: false,
  });
  const ask = (part: Partial<Asked>) => setAsked((now) => ({ ...now, ...part }));
  const shown = found(orders, asked, me, today);
  const overdue = orders.filter((order) => isOverdue(order, today)).length;

  return (
    <main id="main" className="mx-auto flex w-full max-w-360 flex-col gap-4 px-5 py-6">
      <div className="flex flex-wrap items-center justify-between gap-3">
        <h1 className="text-head">Cut orders</h1>
        {mayOrder && (
          <Button look="action" onPress={() => setOrdering(true)}>
            New order
          </Button>
        )}
      </div>
      {query.isError && (
        <Notice look="warn">{query.error.message} The list below may be out of date.</Notice>
      )}
      {orders.length === 0 ? (
        <p className="max-w-150 border-t border-line pt-4 text-lead">
          {mayOrder
            ? 'No cut orders yet. Release a revision of a design, then order its parts here: how many, from which sheet, on which machine, until when.'
            : 'No cut orders yet. Once a builder has ordered something, it stands here with the files to cut from.'}
        </p>
      ) : (
        <>
          <div className="flex flex-wrap items-end gap-x-4 gap-y-3">
            <div className="w-full max-w-80 grow">
              <SearchField
                label="Search"
                value={asked.words}
                onChange={(words) => ask({ words })}
              />
            </div>
            <SelectField
              label="State"
              value={asked.state}
              options={stateOptions}
              onChange={(state) => ask({ state })}
            />
            <CheckField label="Mine" value={asked.mine} onChange={(mine) => ask({ mine })} />
            <CheckField
              label={`Overdue (${overdue})`}
              value={asked.overdue}
              onChange={(on) => ask({ overdue: on })}
            />
            <p role="status" className="py-2 text-ink-2">
              {shown.length === orders.length
                ? `${orders.length} ${orders.length === 1 ? 'order' : 'orders'}`
                : `${shown.length} of ${orders.length} orders`}
            </p>
          </div>
          <OrdersTable orders={shown} today={today} />
          <TodayWords today={today} />
        </>
      )}
      <Suspense>{ordering && <OrderDialog onClose={() => setOrdering(false)} />}</Suspense>
    </main>
  );
}
