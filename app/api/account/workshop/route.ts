import { ownWorkshop, requirePerson } from '@/lib/account/person';
import { workshopCookie } from '@/lib/chosen-workshop';
import { route } from '@/lib/route';

/** Changes to another of one's workshops: the form in the bar, which needs no script. */
export const POST = route(async (request) => {
  const person = await requirePerson();
  const form = await request.formData().catch(() => new FormData());
  const { id } = ownWorkshop(person, form.get('workshop'));
  return new Response(null, {
    status: 303,
    headers: {
      Location: '/designs',
      'Set-Cookie': workshopCookie(id),
      'Cache-Control': 'no-store',
    },
  });
});
