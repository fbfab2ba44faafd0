import { openWorkshop } from '@/lib/account/open-workshop';
import { requirePerson } from '@/lib/account/person';
import { workshopCookie } from '@/lib/chosen-workshop';
import { readJson } from '@/lib/json-body';
import { json, route } from '@/lib/route';

export const POST = route(async (request) => {
  await requirePerson();
  const { workshopId } = await openWorkshop(await readJson(request));
  const response = json({ id: workshopId }, 201);
  response.headers.append('Set-Cookie', workshopCookie(workshopId));
  return response;
});
