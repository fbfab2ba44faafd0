import { attachment } from '@/lib/attachment';
import { recordDownload } from '@/lib/record-download';
import { route } from '@/lib/route';

export const GET = route<{ id: string; name: string }>(async (request, { id, name }) =>
  attachment(request, await recordDownload(id, name)),
);
