import { readJson } from '@/lib/json-body';
import { nameRevision } from '@/lib/revisions/name-revision';
import { json, route } from '@/lib/route';

export const POST = route<{ id: string }>(async (request, { id }) =>
  json(await nameRevision(id, await readJson(request)), 201),
);
