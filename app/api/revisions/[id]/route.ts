import { requireMember } from '@/lib/access';
import { notFound } from '@/lib/errors';
import { findRevision } from '@/lib/revisions/queries';
import { json, route } from '@/lib/route';

export const GET = route<{ id: string }>(async (_request, { id }) => {
  const revision = await findRevision(await requireMember(), id);
  if (!revision) throw notFound('revision');
  return json(revision);
});
