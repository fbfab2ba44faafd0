import { attachment } from '@/lib/attachment';
import { LAYOUT_LIMIT, readJson } from '@/lib/json-body';
import { route } from '@/lib/route';
import { writeSheets } from '@/lib/write-sheets';

export const POST = route<{ id: string }>(async (request, { id }) =>
  attachment(request, await writeSheets(id, await readJson(request, LAYOUT_LIMIT))),
);
