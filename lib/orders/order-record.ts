import 'server-only';
import type { EntityManager, Loaded } from '@mikro-orm/postgresql';
import {
  Attachment,
  OrderMessage,
  RevisionFile,
  type CutOrder,
  type ShopItem,
} from '@/entities';
import { machineOf, type MachineValues } from '@/geometry/cutting/shop-parameters';
import { mayCut, mayEdit, mayOrder, type Viewer } from '../access';
import { machineCautions } from '../kernel/kernel';
import { toShopItem } from '../shop-items';
import type { Order, OrderSummary } from '../schemas/order';
import { hindranceOf, orderedRevisions, type StoredRevision } from './ordered-revision';
import {
  isSameSheet,
  kindOf,
  revisionParts,
  sheetWords,
  type RevisionPart,
} from './revision-parts';
import { isShown } from './sniff-file';

type File = OrderSummary['files'][number];
type ListedFile = Pick<
  RevisionFile,
  'name' | 'label' | 'kind' | 'bytes' | 'sha256' | 'revision'
>;
type Shown = Loaded<CutOrder, 'orderedBy' | 'takenBy' | 'sheet' | 'machine'>;

const fileOf = ({ name, label, kind, bytes, sha256 }: ListedFile): File => ({
  name,
  label,
  kind: kind as File['kind'],
  bytes,
  sha256,
});

/** Does a file show this part alone? */
const isOf = ({ part }: RevisionPart, { name }: Pick<File, 'name'>): boolean =>
  name.includes(`_${part.key}_`);

/** The files of revisions, without their bytes, in their order. */
function filesOf(tx: EntityManager, revisions: readonly string[]): Promise<ListedFile[]> {
  return tx.find(
    RevisionFile,
    { revision: { $in: [...revisions] } },
    {
      fields: ['name', 'label', 'kind', 'bytes', 'sha256', 'revision'],
      orderBy: { position: 'asc' },
    },
  );
}

const person = ({ id, name }: { id: string; name: string }) => ({ id, name });

function revisionOf(revision: StoredRevision): OrderSummary['revision'] {
  const { id, designId, designName, number, name, state } = revision;
  return { id, designId, designName, number, name, state };
}

function summary(order: Shown, revision: StoredRevision, files: File[]): OrderSummary {
  const { id, number, version, state, quantity, sheets, dueOn } = order;
  return {
    id,
    number,
    version,
    state,
    revision: revisionOf(revision),
    quantity,
    sheets,
    sheet: person(order.sheet),
    machine: person(order.machine),
    dueOn,
    orderedBy: person(order.orderedBy),
    takenBy: order.takenBy ? person(order.takenBy) : null,
    files: revision.state === 'released' ? files : [],
    updatedAt: order.updatedAt.toISOString(),
  };
}

const isOpen = ({ state }: CutOrder): boolean => state !== 'cut' && state !== 'cancelled';

/** Rows of the queue; those that are still to cut with the files to cut from. */
export async function toSummaries(
  tx: EntityManager,
  orders: readonly Shown[],
): Promise<OrderSummary[]> {
  const revisions = await orderedRevisions(
    tx,
    orders.map(({ revision }) => revision.id),
  );
  const toCut = new Set(
    orders
      .filter(
        (order) => isOpen(order) && revisions.get(order.revision.id)?.state === 'released',
      )
      .map(({ revision }) => revision.id),
  );
  const files = await filesOf(tx, [...toCut]);
  const parts = new Map<string, readonly RevisionPart[]>();
  for (const id of toCut) parts.set(id, await revisionParts(tx, id));
  return orders.map((order) => {
    const revision = revisions.get(order.revision.id)!;
    const sheet = kindOf(order.sheet.values);
    const covered = isOpen(order)
      ? (parts.get(revision.id) ?? []).filter(({ part }) => isSameSheet(part, sheet))
      : [];
    const own = files.filter(
      (file) =>
        file.revision.id === revision.id &&
        file.kind === 'dxf' &&
        covered.some((part) => isOf(part, file)),
    );
    return summary(order, revision, own.map(fileOf));
  });
}

const itemOf = (item: Loaded<ShopItem, 'updatedBy'>): Order['sheet'] => ({
  ...toShopItem(item),
  gone: item.deletedAt !== null,
});

async function messagesOf(tx: EntityManager, order: string): Promise<Order['messages']> {
  const messages = await tx.find(
    OrderMessage,
    { order },
    { populate: ['author'], orderBy: { createdAt: 'asc', id: 'asc' } },
  );
  const attached = await tx.find(
    Attachment,
    { message: { $in: messages.map(({ id }) => id) } },
    {
      fields: ['name', 'mediaType', 'bytes', 'message'],
      orderBy: { createdAt: 'asc', id: 'asc' },
    },
  );
  return messages.map(({ id, kind, text, createdAt, author }) => ({
    id,
    kind,
    text,
    at: createdAt.toISOString(),
    author: person(author),
    attachments: attached
      .filter(({ message }) => message.id === id)
      .map(({ id: attachmentId, name, mediaType, bytes }) => ({
        id: attachmentId,
        name,
        mediaType,
        bytes,
        shown: isShown(mediaType),
      })),
  }));
}

/** What the machine makes of the parts, reckoned once for each revision, sheet and machine. */
const cautionsOf = ({ revision, sheet, machine }: Shown, parts: readonly RevisionPart[]) =>
  machineCautions(
    `${revision.id} ${sheetWords(kindOf(sheet.values))}`,
    parts.map(({ part }) => part),
    machineOf(machine.name, machine.values as MachineValues),
  );

/** All of an order, as this person may see it. */
export async function toOrder(
  tx: EntityManager,
  viewer: Viewer,
  stored: CutOrder,
): Promise<Order> {
  const order = await tx.populate(stored, [
    'orderedBy',
    'takenBy',
    'sheet.updatedBy',
    'machine.updatedBy',
  ]);
  const revisionId = order.revision.id;
  const revision = (await orderedRevisions(tx, [revisionId])).get(revisionId)!;
  const files = (await filesOf(tx, [revisionId])).map(fileOf);
  const all = await revisionParts(tx, revisionId);
  const sheet = kindOf(order.sheet.values);
  const covered = all.filter(({ part }) => isSameSheet(part, sheet));
  const others = all.filter((each) => !covered.includes(each));
  const parts = covered.map((each) => ({
    ...each.shown,
    files: files.filter((file) => isOf(each, file)),
  }));
  const open = isOpen(order);
  return {
    ...summary(
      order,
      revision,
      parts.flatMap((part) => part.files.filter(({ kind }) => kind === 'dxf')),
    ),
    sheet: itemOf(order.sheet),
    machine: itemOf(order.machine),
    note: order.note,
    orderedAt: order.createdAt.toISOString(),
    parts,
    otherFiles: files.filter((file) => !all.some((each) => isOf(each, file))),
    otherParts: others.map(({ part }) => ({ label: part.label, sheet: sheetWords(part) })),
    cautions: await cautionsOf(order, covered),
    hindrance: open ? hindranceOf(revision) : null,
    successor:
      revision.released && revision.released.id !== revisionId ? revision.released : null,
    scrap: order.scrap ?? null,
    actualKerf: order.actualKerf ?? null,
    cutAt: order.cutAt?.toISOString() ?? null,
    messages: await messagesOf(tx, order.id),
    may: {
      order: mayOrder(viewer.role),
      cut: mayCut(viewer.role),
      edit: mayEdit(viewer.role),
    },
  };
}
