import { requireMember } from '@/lib/access';
import { readJson } from '@/lib/json-body';
import { beginOrder } from '@/lib/orders/begin-order';
import { json, route } from '@/lib/route';

export const POST = route<{ id: string }>(async (request, { id }) => {
  await requireMember();
  return json(await beginOrder(id, await readJson(request)));
});
