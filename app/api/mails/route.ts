import { mayManagePeople, requireMember } from '@/lib/access';
import { listMails } from '@/lib/mail/list-mails';
import { json, route } from '@/lib/route';

export const GET = route(async () =>
  json(await listMails(await requireMember(mayManagePeople))),
);
