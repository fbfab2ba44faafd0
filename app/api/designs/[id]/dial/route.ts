import { attachment } from '@/lib/attachment';
import { makeDial } from '@/lib/make-dial';
import { route } from '@/lib/route';

export const GET = route<{ id: string }>(async (request, { id }) =>
  attachment(
    request,
    await makeDial(id, Object.fromEntries(new URL(request.url).searchParams)),
  ),
);
