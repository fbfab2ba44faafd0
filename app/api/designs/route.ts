import { requireMember } from '@/lib/access';
import { createDesign } from '@/lib/create-design';
import { readJson } from '@/lib/json-body';
import { listDesigns } from '@/lib/queries';
import { json, route } from '@/lib/route';

export const GET = route(async () =>
  json({ designs: await listDesigns(await requireMember()) }),
);

export const POST = route(async (request) =>
  json(await createDesign(await readJson(request)), 201),
);
