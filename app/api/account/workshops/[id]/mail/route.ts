import { chooseMail } from '@/lib/account/choose-mail';
import { requirePerson } from '@/lib/account/person';
import { readJson } from '@/lib/json-body';
import { json, route } from '@/lib/route';

export const PUT = route<{ id: string }>(async (request, { id }) => {
  await requirePerson();
  return json(await chooseMail(id, await readJson(request)));
});
