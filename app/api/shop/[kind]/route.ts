import { requireMember } from '@/lib/access';
import { createShopItem } from '@/lib/create-shop-item';
import { readJson } from '@/lib/json-body';
import { json, route } from '@/lib/route';
import { listShopItems, shopKind } from '@/lib/shop-items';

interface Params {
  kind: string;
}

export const GET = route<Params>(async (_request, { kind }) => {
  const viewer = await requireMember();
  return json({ items: await listShopItems(viewer, shopKind(kind)) });
});

export const POST = route<Params>(async (request, { kind }) => {
  await requireMember();
  return json(await createShopItem(shopKind(kind), await readJson(request)), 201);
});
