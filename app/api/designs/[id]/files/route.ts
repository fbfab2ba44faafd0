import { listFiles } from '@/lib/design-files';
import { json, route } from '@/lib/route';

export const GET = route<{ id: string }>(async (_request, { id }) => json(await listFiles(id)));
