import { requirePerson } from '@/lib/account/person';
import { setOwnName } from '@/lib/account/set-own-name';
import { readJson } from '@/lib/json-body';
import { json, route } from '@/lib/route';

export const PUT = route(async (request) => {
  await requirePerson();
  return json(await setOwnName(await readJson(request)));
});
