import { requireMember } from '@/lib/access';
import { readJson } from '@/lib/json-body';
import { invitePerson } from '@/lib/people/invite-person';
import { json, route } from '@/lib/route';

export const POST = route(async (request) => {
  await requireMember();
  return json(await invitePerson(await readJson(request)), 201);
});
