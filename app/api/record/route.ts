import { mayReadRecord, requireMember } from '@/lib/access';
import { badInput } from '@/lib/errors';
import { recordPage } from '@/lib/record-queries';
import { json, route } from '@/lib/route';
import { recordQuerySchema } from '@/lib/schemas/record';

export const GET = route(async (request) => {
  const viewer = await requireMember(mayReadRecord);
  const asked = Object.fromEntries(new URL(request.url).searchParams);
  const parsed = recordQuerySchema.safeParse(asked);
  if (!parsed.success) throw badInput(parsed.error);
  return json(await recordPage(viewer, parsed.data));
});
