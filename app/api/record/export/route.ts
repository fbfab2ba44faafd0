import { mayReadRecord, requireMember } from '@/lib/access';
import { badInput } from '@/lib/errors';
import { recordCsv } from '@/lib/record-csv';
import { route } from '@/lib/route';
import { recordQuerySchema } from '@/lib/schemas/record';

export const GET = route(async (request) => {
  const viewer = await requireMember(mayReadRecord);
  const asked = Object.fromEntries(new URL(request.url).searchParams);
  const parsed = recordQuerySchema.safeParse(asked);
  if (!parsed.success) throw badInput(parsed.error);
  return new Response(recordCsv(viewer, parsed.data), {
    headers: {
      'Content-Type': 'text/csv; charset=utf-8',
      'Content-Disposition': 'attachment; filename="record.csv"',
      'Cache-Control': 'no-store',
    },
  });
});
