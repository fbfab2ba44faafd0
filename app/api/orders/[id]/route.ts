import { requireMember } from '@/lib/access';
import { notFound } from '@/lib/errors';
import { readJson } from '@/lib/json-body';
import { changeOrder } from '@/lib/orders/change-order';
import { findOrder } from '@/lib/orders/order-queries';
import { json, route } from '@/lib/route';

interface Params {
  id: string;
}

export const GET = route<Params>(async (_request, { id }) => {
  const order = await findOrder(await requireMember(), id);
  if (!order) throw notFound('order');
  return json(order);
});

export const PUT = route<Params>(async (request, { id }) => {
  await requireMember();
  return json(await changeOrder(id, await readJson(request)));
});
