import { requireSession } from '@/lib/access';
import { changeStream } from '@/lib/live/stream';
import { route } from '@/lib/route';

export const dynamic = 'force-dynamic';

export const GET = route(async (request) => {
  const { viewer, epoch } = await requireSession();
  return new Response(changeStream(viewer, epoch, request.signal), {
    headers: {
      'Content-Type': 'text/event-stream; charset=utf-8',
      'Cache-Control': 'no-store',
      // nginx would hold events back.
      'X-Accel-Buffering': 'no',
    },
  });
});
