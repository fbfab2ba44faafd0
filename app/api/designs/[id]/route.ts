import { requireMember } from '@/lib/access';
import { deleteDesign } from '@/lib/delete-design';
import { notFound } from '@/lib/errors';
import { readJson } from '@/lib/json-body';
import { findDesign } from '@/lib/queries';
import { json, route } from '@/lib/route';
import { saveDesign } from '@/lib/save-design';

interface Params {
  id: string;
}

export const GET = route<Params>(async (_request, { id }) => {
  const design = await findDesign(await requireMember(), id);
  if (!design) throw notFound();
  return json(design);
});

export const PUT = route<Params>(async (request, { id }) =>
  json(await saveDesign(id, await readJson(request))),
);

export const DELETE = route<Params>(async (_request, { id }) => {
  await deleteDesign(id);
  return new Response(null, { status: 204 });
});
