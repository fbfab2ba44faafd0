import 'server-only';
import type { CutOrder } from '@/entities';
import { mayOrder, requireMember } from '../access';
import { changesBetween } from '../changes';
import { inWorkshop } from '../db';
import { badInput, notFound } from '../errors';
import { addRecord } from '../record';
import { changeOrderSchema, type Order } from '../schemas/order';
import { refusePastDay } from './due-day';
import { fittingItems } from './fitting-items';
import { lockOrder, refuseHindered, refuseStaleOrder, refuseState } from './lock-order';
import { toOrder } from './order-record';
import { holdRevision } from './ordered-revision';

function termsOf(order: CutOrder): Record<string, unknown> {
  const { quantity, sheets, dueOn, note, sheet, machine } = order;
  return { quantity, sheets, dueOn, note, sheet: sheet.name, machine: machine.name };
}

/**
 * Changes what was asked for, while nobody cuts it. Asking for the same changes nothing.
 * @throws RequestError not-found, bad-input, conflict
 */
export async function changeOrder(id: string, input: unknown): Promise<Order> {
  const viewer = await requireMember(mayOrder);
  return inWorkshop(viewer, async (tx) => {
    const order = await lockOrder(tx, viewer, id);
    const parsed = changeOrderSchema.safeParse(input);
    if (!parsed.success) throw badInput(parsed.error);
    const { version, sheet: sheetId, machine: machineId, ...terms } = parsed.data;
    await refuseStaleOrder(tx, viewer, order, version);
    refuseState(order, ['queued', 'returned'], 'changed');
    await refuseHindered(tx, viewer, order);
    const revision = await holdRevision(tx, viewer.workshopId, order.revision.id);
    if (!revision) throw notFound('revision');
    await tx.populate(order, ['sheet', 'machine']);
    const before = termsOf(order);
    const ids = { sheet: sheetId, machine: machineId };
    const items = await fittingItems(tx, viewer, revision, ids);
    if (terms.dueOn !== order.dueOn) refusePastDay(terms.dueOn);
    tx.assign(order, { ...terms, ...items });
    const changes = changesBetween(before, termsOf(order));
    if (changes.length === 0) return toOrder(tx, viewer, order);

    order.version += 1;
    order.updatedAt = new Date();
    addRecord(tx, viewer, {
      what: 'order-changed',
      subject: id,
      revision: order.revision.id,
      detail: { number: order.number, version: order.version, changes },
    });
    await tx.flush();
    return toOrder(tx, viewer, order);
  });
}
