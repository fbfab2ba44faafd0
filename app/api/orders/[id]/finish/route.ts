import { requireMember } from '@/lib/access';
import { readJson } from '@/lib/json-body';
import { finishOrder } from '@/lib/orders/finish-order';
import { json, route } from '@/lib/route';

export const POST = route<{ id: string }>(async (request, { id }) => {
  await requireMember();
  return json(await finishOrder(id, await readJson(request)));
});
