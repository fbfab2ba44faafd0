import { requireMember } from '@/lib/access';
import { listPeople } from '@/lib/people/list-people';
import { json, route } from '@/lib/route';

export const GET = route(async () => json(await listPeople(await requireMember())));
