import { requireMember } from '@/lib/access';
import { notFound } from '@/lib/errors';
import { answerOrder } from '@/lib/orders/answer-order';
import { readMessage } from '@/lib/orders/message-form';
import { findOrder } from '@/lib/orders/order-queries';
import { remarkOrder } from '@/lib/orders/remark-order';
import { returnOrder } from '@/lib/orders/return-order';
import { json, route } from '@/lib/route';

const written = { remark: remarkOrder, question: returnOrder, answer: answerOrder };

export const POST = route<{ id: string }>(async (request, { id }) => {
  // Nothing as large as files is read for an order that is none of theirs.
  if (!(await findOrder(await requireMember(), id))) throw notFound('order');
  const message = await readMessage(request);
  return json(await written[message.kind](id, message), 201);
});
