import { pingDatabase } from '@/lib/db';
import { json, route } from '@/lib/route';

export const dynamic = 'force-dynamic';

export const GET = route(async () => {
  await pingDatabase();
  return json({ status: 'ok' });
});
