import { requireMember } from '@/lib/access';
import { deleteShopItem } from '@/lib/delete-shop-item';
import { readJson } from '@/lib/json-body';
import { json, route } from '@/lib/route';
import { saveShopItem } from '@/lib/save-shop-item';
import { shopKind } from '@/lib/shop-items';

interface Params {
  kind: string;
  id: string;
}

export const PUT = route<Params>(async (request, { kind, id }) => {
  await requireMember();
  return json(await saveShopItem(shopKind(kind), id, await readJson(request)));
});

export const DELETE = route<Params>(async (_request, { kind, id }) => {
  await requireMember();
  await deleteShopItem(shopKind(kind), id);
  return new Response(null, { status: 204 });
});
