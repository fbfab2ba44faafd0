import 'server-only';
import { Attachment } from '@/entities';
import { mayRead, requireMember } from '../access';
import { inWorkshop } from '../db';
import { notFound } from '../errors';
import { idSchema } from '../schemas/id';
import { isShown, type SniffedFile } from './sniff-file';

/** One file of a thread of the viewer's workshop. @throws RequestError not-found */
export async function findAttachment(
  id: string,
): Promise<SniffedFile & { readonly shown: boolean }> {
  const viewer = await requireMember(mayRead);
  if (!idSchema.safeParse(id).success) throw notFound('attachment');
  const stored = await inWorkshop(viewer, (tx) =>
    tx.findOne(
      Attachment,
      { id, workshop: viewer.workshopId },
      { fields: ['name', 'mediaType', 'sha256', 'body'] },
    ),
  );
  if (!stored) throw notFound('attachment');
  const { name, mediaType, sha256, body } = stored;
  return { name, mediaType, sha256, body: Buffer.from(body.$), shown: isShown(mediaType) };
}
