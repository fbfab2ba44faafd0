import 'server-only';
import { LockMode, type EntityManager, type Loaded } from '@mikro-orm/postgresql';
import { ShopItem } from '@/entities';
import { mayRead, type Viewer } from './access';
import { inWorkshop } from './db';
import { notFound, RequestError } from './errors';
import { idSchema } from './schemas/id';
import { shopKindSchema, type ShopItem as ShopItemRecord, type ShopKind } from './schemas/shop';

const kinds = { machines: 'machine', sheets: 'sheet' } as const;

/** The kind that a route names. @throws RequestError not-found */
export function shopKind(named: string): ShopKind {
  const parsed = shopKindSchema.safeParse(named);
  if (!parsed.success) throw notFound();
  return parsed.data;
}

export const storedKind = (kind: ShopKind): ShopItem['kind'] => kinds[kind];

export function toShopItem(stored: Loaded<ShopItem, 'updatedBy'>): ShopItemRecord {
  const { id, name, version, values, updatedAt, updatedBy } = stored;
  return {
    id,
    name,
    version,
    values,
    updatedAt: updatedAt.toISOString(),
    updatedBy: { id: updatedBy.id, name: updatedBy.name },
  };
}

/** The workshop's machines or sheet, by name. */
export async function listShopItems(viewer: Viewer, kind: ShopKind): Promise<ShopItemRecord[]> {
  if (!mayRead(viewer.role)) return [];
  const stored = await inWorkshop(viewer, (tx) =>
    tx.find(
      ShopItem,
      { workshop: viewer.workshopId, kind: storedKind(kind), deletedAt: null },
      { populate: ['updatedBy'], orderBy: { name: 'asc', id: 'asc' } },
    ),
  );
  return stored.map(toShopItem);
}

/** One of them, held until the transaction ends. @throws RequestError not-found */
export async function lockShopItem(
  tx: EntityManager,
  viewer: Viewer,
  kind: ShopKind,
  id: string,
): Promise<Loaded<ShopItem, 'updatedBy'>> {
  if (!idSchema.safeParse(id).success) throw notFound(storedKind(kind));
  const stored = await tx.findOne(
    ShopItem,
    { id, workshop: viewer.workshopId, kind: storedKind(kind), deletedAt: null },
    { lockMode: LockMode.PESSIMISTIC_WRITE },
  );
  if (!stored) throw notFound(storedKind(kind));
  return tx.populate(stored, ['updatedBy']);
}

/** @throws RequestError conflict when the work began from another version */
export function refuseStaleItem(
  stored: Loaded<ShopItem, 'updatedBy'>,
  version: number | undefined,
): void {
  if (stored.version === version) return;
  if (version === undefined) {
    throw new RequestError('bad-input', 'Version: missing; give the one that you opened.', {
      field: 'version',
    });
  }
  throw new RequestError(
    'conflict',
    `${stored.name}: ${stored.updatedBy.name} has changed it since you opened it; take theirs or save yours over it.`,
    { field: 'version', current: toShopItem(stored) },
  );
}
