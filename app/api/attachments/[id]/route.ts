import { attachment } from '@/lib/attachment';
import { findAttachment } from '@/lib/orders/find-attachment';
import { route } from '@/lib/route';

export const GET = route<{ id: string }>(async (request, { id }) => {
  const file = await findAttachment(id);
  return attachment(request, file, file.shown ? 'inline' : 'attachment');
});
