import { resetPassword } from '@/lib/account/reset-password';
import { addressOf } from '@/lib/attempts';
import { readJson } from '@/lib/json-body';
import { json, route } from '@/lib/route';

/** Open to whoever holds a link. Its secret comes in the body, which no log holds. */
export const POST = route(async (request) => {
  const address = addressOf(request.headers.get('x-forwarded-for'));
  return json(await resetPassword(await readJson(request), address));
});
