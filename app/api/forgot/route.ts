import { askReset } from '@/lib/account/ask-reset';
import { addressOf } from '@/lib/attempts';
import { readJson } from '@/lib/json-body';
import { route } from '@/lib/route';

/** Open to everybody, with one answer for all. */
export const POST = route(async (request) => {
  const address = addressOf(request.headers.get('x-forwarded-for'));
  await askReset(await readJson(request), address);
  return new Response(null, { status: 204 });
});
