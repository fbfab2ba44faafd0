import 'server-only';
import { formatQuantity } from '@/geometry';
import { machineParameters } from '@/geometry/cutting/shop-parameters';
import { mayCut, requireMember } from '../access';
import { inWorkshop } from '../db';
import { badInput, RequestError } from '../errors';
import { tellMembers } from '../mail/tell-members';
import { addRecord } from '../record';
import { finishOrderSchema, type Order } from '../schemas/order';
import { drawStock } from './draw-stock';
import { lockOrder, refuseHindered, refuseStaleOrder, refuseState } from './lock-order';
import { toOrder } from './order-record';

const { min, max } = machineParameters.kerf;

/** @throws RequestError bad-input for a kerf that no machine's profile could hold */
function refuseKerf(kerf: number | null): void {
  if (kerf === null || (kerf >= min && kerf <= max)) return;
  throw new RequestError(
    'bad-input',
    `Kerf: ${formatQuantity(kerf, 'length')} is outside ${min} to ${max} mm; measure it again.`,
    { field: 'actualKerf' },
  );
}

/**
 * Says that an order is cut, with what came of it, and draws the sheets down in the store with it.
 * @throws RequestError not-found, bad-input, conflict
 */
export async function finishOrder(id: string, input: unknown): Promise<Order> {
  const viewer = await requireMember(mayCut);
  return inWorkshop(viewer, async (tx) => {
    const order = await lockOrder(tx, viewer, id);
    const parsed = finishOrderSchema.safeParse(input);
    if (!parsed.success) throw badInput(parsed.error);
    const { version, sheets, scrap, actualKerf } = parsed.data;
    refuseKerf(actualKerf);
    await refuseStaleOrder(tx, viewer, order, version);
    refuseState(order, ['cutting'], 'finished');
    await refuseHindered(tx, viewer, order);
    await drawStock(tx, viewer, order, sheets);
    const asked = order.sheets;
    const now = new Date();
    tx.assign(order, {
      ...{ state: 'cut' as const, sheets, scrap, actualKerf },
      ...{ version: order.version + 1, cutAt: now, updatedAt: now },
    });
    addRecord(tx, viewer, {
      what: 'order-cut',
      subject: id,
      revision: order.revision.id,
      detail: {
        ...{ number: order.number, version: order.version },
        ...{ quantity: order.quantity, scrap, actualKerf, sheets, sheetsAsked: asked },
      },
    });
    const orderedBy = order.orderedBy.id;
    await tellMembers(tx, viewer, {
      choice: 'cut',
      event: `order-cut:${id}`,
      to: ({ userId }) => userId === orderedBy,
      subject: `Order ${order.number} is cut`,
      lines: [
        `${viewer.name} has cut order ${order.number}: ${order.quantity} × its parts, ${scrap} ${scrap === 1 ? 'piece' : 'pieces'} spoilt, ${sheets} ${sheets === 1 ? 'sheet' : 'sheets'} used.`,
        ...(actualKerf === null
          ? []
          : [`Kerf as measured: ${formatQuantity(actualKerf, 'length')}.`]),
      ],
      link: { path: `/orders/${id}`, label: `Open order ${order.number}` },
    });
    await tx.flush();
    return toOrder(tx, viewer, order);
  });
}
