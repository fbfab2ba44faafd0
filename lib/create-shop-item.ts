import 'server-only';
import { randomUUID } from 'node:crypto';
import { ShopItem, User, Workshop } from '@/entities';
import { mayEdit, requireMember } from './access';
import { inWorkshop } from './db';
import { badInput } from './errors';
import { addRecord } from './record';
import {
  saveItemSchemas,
  type ShopItem as ShopItemRecord,
  type ShopKind,
} from './schemas/shop';
import { storedKind, toShopItem } from './shop-items';

/** Adds a machine or sheet to the viewer's workshop. */
export async function createShopItem(kind: ShopKind, input: unknown): Promise<ShopItemRecord> {
  const viewer = await requireMember(mayEdit);
  const parsed = saveItemSchemas[kind].safeParse(input);
  if (!parsed.success) throw badInput(parsed.error);
  const { name, values } = parsed.data;
  return inWorkshop(viewer, async (tx) => {
    const stored = tx.create(ShopItem, {
      id: randomUUID(),
      createdAt: new Date(),
      workshop: tx.getReference(Workshop, viewer.workshopId),
      kind: storedKind(kind),
      name,
      values: values as unknown as ShopItem['values'],
      updatedBy: await tx.findOneOrFail(User, viewer.userId),
      updatedAt: new Date(),
    });
    addRecord(tx, viewer, {
      what: 'item-created',
      subject: stored.id,
      detail: { kind, name, values },
    });
    await tx.flush();
    return toShopItem(await tx.populate(stored, ['updatedBy']));
  });
}
