'use client';

import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { loadOrders } from '@/components/api/load-orders';
import { orderKeys } from '@/components/api/order-keys';
import { fetchShopItems, shopKey } from '@/components/api/shop';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Notice } from '@/components/ui/notice';
import { SelectField } from '@/components/ui/select-field';
import type { Order, Orderable } from '@/lib/schemas/order';
import { OrderForm, type Terms } from './order-form';

const nameOf = ({ designName, number, name }: Orderable): string =>
  `${designName}, revision ${number}: ${name}`;

/** What was ordered just now, and the way to it. */
function Placed({ order, onClose }: { order: Order; onClose: () => void }) {
  const { number, otherParts } = order;
  return (
    <>
      <Notice>
        Order {number} stands in the queue; the machinists are told.
        {otherParts.length > 0 &&
          ` Not in it: ${otherParts.map(({ label, sheet }) => `${label} (${sheet})`).join(', ')}.`}
      </Notice>
      <div className="flex flex-wrap items-center justify-end gap-4">
        <a href={`/orders/${order.id}`}>Open order {number}</a>
        <Button look="action" onPress={onClose} autoFocus>
          Done
        </Button>
      </div>
    </>
  );
}

/** Orders cutting of a released revision, or changes what was ordered. */
export default function OrderDialog({
  revision: fixed,
  order = null,
  like = null,
  onClose,
}: {
  /** Id of the one to order; without it one is chosen. */
  revision?: string;
  /** The order to change. */
  order?: Order | null;
  /** An earlier one, for what a new one begins with. */
  like?: Order | null;
  onClose: () => void;
}) {
  const client = useQueryClient();
  const revisions = useQuery({
    queryKey: orderKeys.orderable,
    queryFn: async () => (await loadOrders()).fetchOrderable(),
  });
  const sheets = useQuery({
    queryKey: shopKey('sheets'),
    queryFn: () => fetchShopItems('sheets'),
  });
  const machines = useQuery({
    queryKey: shopKey('machines'),
    queryFn: () => fetchShopItems('machines'),
  });
  const [chosen, setChosen] = useState<string | null>(order?.revision.id ?? fixed ?? null);
  const saving = useMutation({
    mutationFn: async ({ revision, terms }: { revision: string; terms: Terms }) => {
      const calls = await loadOrders();
      return order
        ? calls.changeOrder(order.id, { version: order.version, ...terms })
        : calls.placeOrder({ revision, ...terms });
    },
    onSuccess: async (stored) => {
      client.setQueryData(orderKeys.one(stored.id), stored);
      await client.invalidateQueries({ queryKey: orderKeys.list });
      if (order) onClose();
    },
  });
  const list = revisions.data ?? [];
  const revision = chosen === null ? list[0] : list.find(({ id }) => id === chosen);
  const title = order ? `Change order ${order.number}` : 'Order cutting';
  const failed = revisions.error ?? sheets.error ?? machines.error;

  return (
    <Dialog title={title} isOpen onClose={onClose} wide>
      {failed && <Notice look="bad">{failed.message}</Notice>}
      {saving.isSuccess && !order ? (
        <Placed order={saving.data} onClose={onClose} />
      ) : revisions.data && sheets.data && machines.data ? (
        <>
          {chosen !== null && chosen === (fixed ?? order?.revision.id)
            ? revision && <p className="font-medium">{nameOf(revision)}</p>
            : list.length > 0 && (
                <SelectField
                  label="Revision"
                  value={revision?.id ?? ''}
                  options={list.map((one) => ({ value: one.id, label: nameOf(one) }))}
                  onChange={setChosen}
                />
              )}
          {revision ? (
            <OrderForm
              // Another revision wants other sheet.
              key={revision.id}
              revision={revision}
              begin={order ?? like}
              sheets={sheets.data}
              machines={machines.data}
              pending={saving.isPending}
              refusal={saving.error?.message ?? null}
              send={order ? 'Change the order' : 'Order cutting'}
              onSend={(terms) => saving.mutate({ revision: revision.id, terms })}
              onClose={onClose}
            />
          ) : (
            <>
              <p>
                {chosen === null
                  ? 'No design has a released revision. Name a revision of a design, have it reviewed and release it; then it can be ordered here.'
                  : 'This revision is not released, so it cannot be ordered.'}
              </p>
              <div className="flex justify-end">
                <Button onPress={onClose}>Close</Button>
              </div>
            </>
          )}
        </>
      ) : (
        !failed && <p>Looking up what can be ordered</p>
      )}
    </Dialog>
  );
}
