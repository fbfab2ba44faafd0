import 'server-only';
import { randomUUID } from 'node:crypto';
import type { EntityManager } from '@mikro-orm/postgresql';
import { CutOrder, Revision, User, Workshop } from '@/entities';
import { mayOrder, requireMember, type Viewer } from '../access';
import { inWorkshop } from '../db';
import { badInput, notFound, RequestError } from '../errors';
import { tellMembers } from '../mail/tell-members';
import { addRecord } from '../record';
import { placeOrderSchema, type Order } from '../schemas/order';
import { dayWords, refusePastDay } from './due-day';
import { fittingItems } from './fitting-items';
import { toOrder } from './order-record';
import { holdRevision } from './ordered-revision';

/** The workshop's next number. One at a time asks, so that none is left out. */
async function nextNumber(tx: EntityManager, { workshopId }: Viewer): Promise<number> {
  await tx.execute('select 1 from workshops where id = ? for no key update', [workshopId]);
  const [row] = await tx.execute<{ next: number }[]>(
    'select coalesce(max(number), 0) + 1 as next from cut_orders where workshop_id = ?',
    [workshopId],
  );
  return row!.next;
}

/**
 * Asks for a released revision to be cut from a sheet that some of its parts want.
 * @throws RequestError not-found, bad-input
 */
export async function placeOrder(input: unknown): Promise<Order> {
  const viewer = await requireMember(mayOrder);
  const parsed = placeOrderSchema.safeParse(input);
  if (!parsed.success) throw badInput(parsed.error);
  const { revision: revisionId, quantity, sheets, dueOn, note, ...ids } = parsed.data;
  return inWorkshop(viewer, async (tx) => {
    const revision = await holdRevision(tx, viewer.workshopId, revisionId);
    if (!revision) throw notFound('revision');
    if (revision.state !== 'released') {
      throw new RequestError(
        'bad-input',
        `Revision: ${revision.number} of ${revision.designName} is ${revision.state.replace('-', ' ')}; only a released revision can be ordered.`,
        { field: 'revision' },
      );
    }
    const { sheet, machine } = await fittingItems(tx, viewer, revision, ids);
    refusePastDay(dueOn);
    const order = tx.create(CutOrder, {
      id: randomUUID(),
      createdAt: new Date(),
      workshop: tx.getReference(Workshop, viewer.workshopId),
      number: await nextNumber(tx, viewer),
      revision: tx.getReference(Revision, revision.id),
      quantity,
      machine,
      sheet,
      sheets,
      dueOn,
      note,
      state: 'queued',
      version: 1,
      orderedBy: tx.getReference(User, viewer.userId),
      updatedAt: new Date(),
    });
    addRecord(tx, viewer, {
      what: 'order-placed',
      subject: order.id,
      revision: revision.id,
      detail: {
        ...{ number: order.number, quantity, sheets, dueOn, note },
        ...{ sheet: sheet.name, machine: machine.name },
      },
    });
    const what = `${quantity} × ${revision.designName}, revision ${revision.number}`;
    await tellMembers(tx, viewer, {
      choice: 'ordered',
      event: `order-placed:${order.id}`,
      to: ({ role }) => role === 'machinist',
      subject: `Order ${order.number}: ${what}`,
      lines: [
        `${viewer.name} ordered ${what} (${revision.name}), due ${dayWords(dueOn)}.`,
        `${sheets} × ${sheet.name}, on ${machine.name}.`,
        ...(note ? [note] : []),
      ],
      link: { path: `/orders/${order.id}`, label: `Open order ${order.number}` },
    });
    await tx.flush();
    return toOrder(tx, viewer, order);
  });
}
