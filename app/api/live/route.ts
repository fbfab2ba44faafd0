import { requireSession } from '@/lib/access';
import { changeStream } from '@/lib/live/stream';
import { route } from '@/lib/route';

export const dynamic = 'force-dynamic';

export const GET = route(async (request) => {
  const { viewer, epoch } = await requireSession();
  const since = new URL(request.url).searchParams.get('since');
  return new Response(changeStream(viewer, epoch, since, request.signal), {
    headers: {
      'Content-Type': 'text/event-stream; charset=utf-8',
      'Cache-Control': 'no-store',
      // nginx would hold events back.
      'X-Accel-Buffering': 'no',
    },
  });
});
