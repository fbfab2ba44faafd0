import { requireMember } from '@/lib/access';
import { notFound } from '@/lib/errors';
import { historyOf } from '@/lib/revisions/queries';
import { json, route } from '@/lib/route';

export const GET = route<{ id: string }>(async (_request, { id }) => {
  const history = await historyOf(await requireMember(), id);
  if (!history) throw notFound();
  return json(history);
});
