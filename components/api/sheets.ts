import type { WriteSheets } from '@/lib/schemas/sheets';
import { send } from './request';

/** The files of a layout, made by the server, under the name it gives them. @throws RequestError */
export async function writeSheets(
  id: string,
  body: WriteSheets,
): Promise<{ readonly name: string; readonly content: Blob }> {
  const answer = await send(`/api/designs/${id}/sheets`, { method: 'POST', body });
  const name = /filename="([^"]+)"/.exec(answer.headers.get('content-disposition') ?? '')?.[1];
  return { name: name ?? 'sheets', content: await answer.blob() };
}
