import { workshopCookie } from '@/lib/chosen-workshop';
import { readJson } from '@/lib/json-body';
import { joinWorkshop } from '@/lib/people/join-workshop';
import { json, route } from '@/lib/route';

/** Open to whoever holds a link. Its secret comes in the body, which no log holds. */
export const POST = route(async (request) => {
  const { email, workshopId } = await joinWorkshop(await readJson(request));
  const response = json({ email });
  response.headers.append('Set-Cookie', workshopCookie(workshopId));
  return response;
});
