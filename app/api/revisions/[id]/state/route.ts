import { readJson } from '@/lib/json-body';
import { moveRevision } from '@/lib/revisions/move-revision';
import { json, route } from '@/lib/route';

export const PUT = route<{ id: string }>(async (request, { id }) =>
  json(await moveRevision(id, await readJson(request))),
);
