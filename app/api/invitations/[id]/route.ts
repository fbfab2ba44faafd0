import { withdrawInvitation } from '@/lib/people/withdraw-invitation';
import { route } from '@/lib/route';

export const DELETE = route<{ id: string }>(async (_request, { id }) => {
  await withdrawInvitation(id);
  return new Response(null, { status: 204 });
});
