import 'server-only';
import { User, type ShopItem } from '@/entities';
import { mayEdit, requireMember } from './access';
import { changesBetween } from './changes';
import { inWorkshop } from './db';
import { badInput } from './errors';
import { addRecord } from './record';
import {
  saveItemSchemas,
  type ShopItem as ShopItemRecord,
  type ShopKind,
} from './schemas/shop';
import { lockShopItem, refuseStaleItem, toShopItem } from './shop-items';

/**
 * Changes a machine or sheet, over the version it began from. Saving what is stored already
 * changes nothing.
 * @throws RequestError conflict
 */
export async function saveShopItem(
  kind: ShopKind,
  id: string,
  input: unknown,
): Promise<ShopItemRecord> {
  const viewer = await requireMember(mayEdit);
  return inWorkshop(viewer, async (tx) => {
    const stored = await lockShopItem(tx, viewer, kind, id);
    const parsed = saveItemSchemas[kind].safeParse(input);
    if (!parsed.success) throw badInput(parsed.error);
    const { name, version, values } = parsed.data;
    refuseStaleItem(stored, version);
    const changes = changesBetween(
      { name: stored.name, values: stored.values },
      { name, values },
    );
    if (changes.length === 0) return toShopItem(stored);

    tx.assign(stored, {
      name,
      values: values as unknown as ShopItem['values'],
      version: stored.version + 1,
      updatedBy: await tx.findOneOrFail(User, viewer.userId),
      updatedAt: new Date(),
    });
    addRecord(tx, viewer, {
      what: 'item-saved',
      subject: id,
      detail: { kind, version: stored.version, changes },
    });
    await tx.flush();
    return toShopItem(stored);
  });
}
