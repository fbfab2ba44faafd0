import { useMutation, useQueryClient } from '@tanstack/react-query';
import { orderKeys } from '@/components/api/order-keys';
import { loadOrders } from '@/components/api/load-orders';
import { RequestError } from '@/components/api/request-error';
import type { Order } from '@/lib/schemas/order';

type Calls = Awaited<ReturnType<typeof loadOrders>>;

/** What is stored, if somebody else's change is why one's own was refused. */
function storedIn(error: Error): Order | null {
  if (!(error instanceof RequestError) || error.code !== 'conflict') return null;
  return error.current && 'dueOn' in error.current ? error.current : null;
}

/** A change to an order; the screen then shows what the server has, also when it refuses. */
export function useOrderChange(id: string, onDone: () => void) {
  const client = useQueryClient();
  const show = (order: Order) => {
    client.setQueryData(orderKeys.one(id), order);
    void client.invalidateQueries({ queryKey: orderKeys.list });
  };
  return useMutation({
    mutationFn: async (change: (calls: Calls) => Promise<Order>) => change(await loadOrders()),
    onSuccess: (order) => {
      show(order);
      onDone();
    },
    onError: (error) => {
      const stored = storedIn(error);
      if (stored) show(stored);
    },
  });
}
