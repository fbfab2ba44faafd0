import {
  orderableSchema,
  orderListSchema,
  orderSchema,
  type ChangeOrder,
  type FinishOrder,
  type Order,
  type Orderable,
  type OrderMessage,
  type OrderSummary,
  type PlaceOrder,
} from '@/lib/schemas/order';
import { request } from './request';

export const fetchOrders = async (): Promise<OrderSummary[]> =>
  (await request(orderListSchema, '/api/orders')).orders;

export const fetchOrder = (id: string): Promise<Order> =>
  request(orderSchema, `/api/orders/${id}`);

export const fetchOrderable = async (): Promise<Orderable[]> =>
  (await request(orderableSchema, '/api/orders/orderable')).revisions;

export const placeOrder = (body: PlaceOrder): Promise<Order> =>
  request(orderSchema, '/api/orders', { method: 'POST', body });

export const changeOrder = (id: string, body: ChangeOrder): Promise<Order> =>
  request(orderSchema, `/api/orders/${id}`, { method: 'PUT', body });

export const moveOrder = (
  { id, version }: Pick<Order, 'id' | 'version'>,
  move: 'begin' | 'cancel',
): Promise<Order> =>
  request(orderSchema, `/api/orders/${id}/${move}`, { method: 'POST', body: { version } });

export const finishOrder = (id: string, body: FinishOrder): Promise<Order> =>
  request(orderSchema, `/api/orders/${id}/finish`, { method: 'POST', body });

/** A remark, a question that returns the order, or an answer that puts it back in the queue. */
export function writeMessage(
  { id, version }: Pick<Order, 'id' | 'version'>,
  kind: OrderMessage['kind'],
  text: string,
  files: readonly File[],
): Promise<Order> {
  const form = new FormData();
  form.set('kind', kind);
  form.set('text', text);
  form.set('version', String(version));
  for (const file of files) form.append('files', file);
  return request(orderSchema, `/api/orders/${id}/messages`, { method: 'POST', body: form });
}
