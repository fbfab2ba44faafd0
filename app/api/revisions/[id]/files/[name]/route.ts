import { attachment } from '@/lib/attachment';
import { downloadRevisionFile } from '@/lib/revisions/download-file';
import { route } from '@/lib/route';

export const GET = route<{ id: string; name: string }>(async (request, { id, name }) =>
  attachment(request, await downloadRevisionFile(id, name)),
);
