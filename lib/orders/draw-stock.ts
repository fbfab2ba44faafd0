import 'server-only';
import type { EntityManager } from '@mikro-orm/postgresql';
import { User, type CutOrder } from '@/entities';
import type { SheetValues } from '@/geometry/cutting/shop-parameters';
import type { Viewer } from '../access';
import { RequestError } from '../errors';
import { addRecord } from '../record';
import { lockShopItem } from '../shop-items';

/**
 * Takes an order's sheets out of the store, never more than lie there; whoever else draws waits.
 * @throws RequestError bad-input naming what is there and what is needed
 */
export async function drawStock(
  tx: EntityManager,
  viewer: Viewer,
  order: CutOrder,
  sheets: number,
): Promise<void> {
  if (sheets === 0) return;
  const { id } = order.sheet;
  const sheet = await lockShopItem(tx, viewer, 'sheets', id).catch((error: unknown) => {
    if (!(error instanceof RequestError) || error.code !== 'not-found') throw error;
    throw new RequestError(
      'bad-input',
      `Sheet: that of order ${order.number} is no longer in the store; return the order with a question, so that another sheet is chosen.`,
      { field: 'sheet' },
    );
  });
  const values = sheet.values as SheetValues;
  if (values.count < sheets) {
    throw new RequestError(
      'bad-input',
      `Sheets used: ${sheets} needed, and ${values.count} of ${sheet.name} in the store; count again, or put right what the store holds first.`,
      { field: 'sheets' },
    );
  }
  const left = values.count - sheets;
  tx.assign(sheet, {
    values: { ...values, count: left },
    version: sheet.version + 1,
    updatedBy: await tx.findOneOrFail(User, viewer.userId),
    updatedAt: new Date(),
  });
  addRecord(tx, viewer, {
    what: 'stock-drawn',
    subject: id,
    revision: order.revision.id,
    detail: {
      ...{ order: order.number, sheets, from: values.count, to: left },
      version: sheet.version,
    },
  });
}
