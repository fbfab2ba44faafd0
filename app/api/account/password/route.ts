import { changePassword } from '@/lib/account/change-password';
import { requirePerson } from '@/lib/account/person';
import { readJson } from '@/lib/json-body';
import { json, route } from '@/lib/route';

export const PUT = route(async (request) => {
  await requirePerson();
  return json(await changePassword(await readJson(request)));
});
