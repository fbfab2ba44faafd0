import 'server-only';
import { randomUUID } from 'node:crypto';
import type { EntityManager } from '@mikro-orm/postgresql';
import { Attachment, OrderMessage, User, Workshop, type CutOrder } from '@/entities';
import type { Viewer } from '../access';
import { RequestError } from '../errors';
import { ATTACHMENT_LIMITS } from '../schemas/order';
import type { GivenMessage } from './message-form';

/** @throws RequestError bad-input when an order would hold more bytes than it may */
async function refuseTooMuch(
  tx: EntityManager,
  { id, number }: CutOrder,
  files: GivenMessage['files'],
): Promise<void> {
  if (files.length === 0) return;
  const [row] = await tx.execute<{ bytes: number }[]>(
    `select coalesce(sum(a.bytes), 0)::int as bytes
      from attachments a join order_messages m on m.id = a.message_id where m.order_id = ?`,
    [id],
  );
  const all = files.reduce((sum, { body }) => sum + body.byteLength, row!.bytes);
  if (all <= ATTACHMENT_LIMITS.order) return;
  const mega = (bytes: number) => (bytes / 1e6).toFixed(1);
  throw new RequestError(
    'bad-input',
    `Files: order ${number} would hold ${mega(all)} MB, and it may hold ${ATTACHMENT_LIMITS.order / 1e6} MB; ${mega(ATTACHMENT_LIMITS.order - row!.bytes)} MB are left.`,
    { field: 'files' },
  );
}

/** Puts a message with its files under an order that the transaction holds. Gives its id. */
export async function addMessage(
  tx: EntityManager,
  viewer: Viewer,
  order: CutOrder,
  { kind, text, files }: GivenMessage,
): Promise<string> {
  await refuseTooMuch(tx, order, files);
  const workshop = tx.getReference(Workshop, viewer.workshopId);
  const author = tx.getReference(User, viewer.userId);
  const id = randomUUID();
  const message = tx.create(OrderMessage, { id, workshop, order, author, kind, text });
  const now = Date.now();
  files.forEach(({ name, mediaType, sha256, body }, index) => {
    tx.create(Attachment, {
      ...{ workshop, message, name, mediaType, sha256, body },
      bytes: body.byteLength,
      // A millisecond apart, so that they keep their order.
      createdAt: new Date(now + index),
    });
  });
  return id;
}

/** What the record keeps of the files. */
export const filesKept = (files: GivenMessage['files']) =>
  files.map(({ name, sha256, body }) => ({ name, sha256, bytes: body.byteLength }));
