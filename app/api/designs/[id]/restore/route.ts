import { readJson } from '@/lib/json-body';
import { restoreDesign } from '@/lib/revisions/restore-design';
import { json, route } from '@/lib/route';

export const POST = route<{ id: string }>(async (request, { id }) =>
  json(await restoreDesign(id, await readJson(request))),
);
