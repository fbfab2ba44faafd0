import { endSessions } from '@/lib/account/end-sessions';
import { route } from '@/lib/route';

export const DELETE = route(async () => {
  await endSessions();
  return new Response(null, { status: 204 });
});
