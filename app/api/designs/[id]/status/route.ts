import { readJson } from '@/lib/json-body';
import { json, route } from '@/lib/route';
import { setDesignStatus } from '@/lib/set-design-status';

export const PUT = route<{ id: string }>(async (request, { id }) =>
  json(await setDesignStatus(id, await readJson(request))),
);
