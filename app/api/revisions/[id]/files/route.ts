import { listRevisionFiles } from '@/lib/revisions/download-file';
import { json, route } from '@/lib/route';

export const GET = route<{ id: string }>(async (_request, { id }) =>
  json(await listRevisionFiles(id)),
);
