import { requireMember } from '@/lib/access';
import { readJson } from '@/lib/json-body';
import { cancelOrder } from '@/lib/orders/cancel-order';
import { json, route } from '@/lib/route';

export const POST = route<{ id: string }>(async (request, { id }) => {
  await requireMember();
  return json(await cancelOrder(id, await readJson(request)));
});
