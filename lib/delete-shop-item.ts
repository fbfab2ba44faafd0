import 'server-only';
import { mayEdit, requireMember } from './access';
import { inWorkshop } from './db';
import { addRecord } from './record';
import type { ShopKind } from './schemas/shop';
import { lockShopItem } from './shop-items';

/** Takes a machine or sheet out of the workshop's sight; its row and its record stay. */
export async function deleteShopItem(kind: ShopKind, id: string): Promise<void> {
  const viewer = await requireMember(mayEdit);
  await inWorkshop(viewer, async (tx) => {
    const stored = await lockShopItem(tx, viewer, kind, id);
    stored.deletedAt = new Date();
    addRecord(tx, viewer, {
      what: 'item-deleted',
      subject: id,
      detail: { kind, name: stored.name },
    });
  });
}
