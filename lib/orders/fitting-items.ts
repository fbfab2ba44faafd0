import 'server-only';
import type { EntityManager } from '@mikro-orm/postgresql';
import type { ShopItem } from '@/entities';
import type { Viewer } from '../access';
import { RequestError } from '../errors';
import { lockShopItem } from '../shop-items';
import type { StoredRevision } from './ordered-revision';
import { isSameSheet, kindOf, revisionParts, sheetsWanted, sheetWords } from './revision-parts';

const listed = new Intl.ListFormat('en-GB');

/** @throws RequestError bad-input when no part of the revision is cut from such sheet */
async function refuseSheet(
  tx: EntityManager,
  { id, number, designName }: StoredRevision,
  sheet: ShopItem,
): Promise<void> {
  const wanted = sheetsWanted(await revisionParts(tx, id)).map((kind) => kind.sheet);
  const kind = kindOf(sheet.values);
  if (wanted.some((each) => isSameSheet(each, kind))) return;
  throw new RequestError(
    'bad-input',
    `Sheet: ${sheet.name} is ${sheetWords(kind)}, and revision ${number} of ${designName} wants ${listed.format(wanted.map(sheetWords)) || 'no sheet at all'}; choose sheet that it wants.`,
    { field: 'sheet' },
  );
}

/**
 * Machine and sheet of the workshop that a revision can be cut with, held until the transaction
 * ends. @throws RequestError not-found, or bad-input when the sheet fits no part
 */
export async function fittingItems(
  tx: EntityManager,
  viewer: Viewer,
  revision: StoredRevision,
  ids: { readonly sheet: string; readonly machine: string },
): Promise<{ sheet: ShopItem; machine: ShopItem }> {
  const sheet = await lockShopItem(tx, viewer, 'sheets', ids.sheet);
  const machine = await lockShopItem(tx, viewer, 'machines', ids.machine);
  await refuseSheet(tx, revision, sheet);
  return { sheet, machine };
}
