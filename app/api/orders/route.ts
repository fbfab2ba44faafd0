import { requireMember } from '@/lib/access';
import { readJson } from '@/lib/json-body';
import { listOrders } from '@/lib/orders/order-queries';
import { placeOrder } from '@/lib/orders/place-order';
import { json, route } from '@/lib/route';

export const GET = route(async () => json({ orders: await listOrders(await requireMember()) }));

export const POST = route(async (request) => {
  await requireMember();
  return json(await placeOrder(await readJson(request)), 201);
});
