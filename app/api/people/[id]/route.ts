import { requireMember } from '@/lib/access';
import { readJson } from '@/lib/json-body';
import { removeMember } from '@/lib/people/remove-member';
import { setMemberRole } from '@/lib/people/set-member-role';
import { route } from '@/lib/route';

interface Params {
  id: string;
}

export const PUT = route<Params>(async (request, { id }) => {
  await requireMember();
  await setMemberRole(id, await readJson(request));
  return new Response(null, { status: 204 });
});

export const DELETE = route<Params>(async (_request, { id }) => {
  await requireMember();
  await removeMember(id);
  return new Response(null, { status: 204 });
});
