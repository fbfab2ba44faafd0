'use client';

import { useMutation, useQueryClient } from '@tanstack/react-query';
import { orderKeys } from '@/components/api/order-keys';
import { saveShopItem, shopKey } from '@/components/api/shop';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { formatQuantity } from '@/geometry';
import type { Order } from '@/lib/schemas/order';

const millimetres = (value: number): string => formatQuantity(value, 'length');

/** The kerf that was measured beside the one the machine is set to, to take over. */
export default function KerfOffer({ order, kerf }: { order: Order; kerf: number }) {
  const client = useQueryClient();
  const { id, name, version, values } = order.machine;
  const saving = useMutation({
    mutationFn: () =>
      saveShopItem('machines', id, { name, version, values: { ...values, kerf } }),
    onSettled: () =>
      Promise.all([
        client.invalidateQueries({ queryKey: orderKeys.one(order.id) }),
        client.invalidateQueries({ queryKey: shopKey('machines') }),
      ]),
  });
  const set = millimetres(Number(values.kerf));
  return (
    <section
      aria-label="Kerf as measured"
      className="flex flex-col items-start gap-2 border-l-4 border-action bg-action-tint px-3 py-2"
    >
      <p>
        {name} is set to a kerf of <strong>{set}</strong>, and this order measured{' '}
        <strong>{millimetres(kerf)}</strong>.
      </p>
      {order.may.edit ? (
        <Button isDisabled={saving.isPending} onPress={() => saving.mutate()}>
          Set {name} to {millimetres(kerf)}
        </Button>
      ) : (
        <p>A builder or the owner can take it over into the machine.</p>
      )}
      {saving.isError && <Notice look="bad">{saving.error.message}</Notice>}
    </section>
  );
}
