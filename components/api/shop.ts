import {
  shopItemSchema,
  shopItemsSchema,
  type ShopItem,
  type ShopKind,
} from '@/lib/schemas/shop';
import { request, send } from './request';

export const shopKey = (kind: ShopKind) => ['shop', kind] as const;

export const fetchShopItems = async (kind: ShopKind): Promise<ShopItem[]> =>
  (await request(shopItemsSchema, `/api/shop/${kind}`)).items;

export interface SaveShopItem {
  readonly name: string;
  readonly values: Readonly<Record<string, string | number>>;
  readonly version?: number;
}

/** Makes an item, or changes the one with the id. */
export const saveShopItem = (
  kind: ShopKind,
  id: string | null,
  body: SaveShopItem,
): Promise<ShopItem> =>
  id === null
    ? request(shopItemSchema, `/api/shop/${kind}`, { method: 'POST', body })
    : request(shopItemSchema, `/api/shop/${kind}/${id}`, { method: 'PUT', body });

export async function deleteShopItem(kind: ShopKind, id: string): Promise<void> {
  await send(`/api/shop/${kind}/${id}`, { method: 'DELETE' });
}
