import { mayOrder, requireMember } from '@/lib/access';
import { listOrderable } from '@/lib/orders/order-queries';
import { json, route } from '@/lib/route';

export const GET = route(async () =>
  json({ revisions: await listOrderable(await requireMember(mayOrder)) }),
);
