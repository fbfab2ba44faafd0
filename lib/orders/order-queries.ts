import 'server-only';
import { CutOrder } from '@/entities';
import { mayOrder, mayRead, type Viewer } from '../access';
import { inWorkshop } from '../db';
import { idSchema } from '../schemas/id';
import type { Order, Orderable, OrderSummary } from '../schemas/order';
import { toOrder, toSummaries } from './order-record';
import { releasedRevisions } from './ordered-revision';
import { revisionParts, sheetsWanted, sheetWords } from './revision-parts';

const shown = ['orderedBy', 'takenBy', 'sheet', 'machine'] as const;

/** Orders that are done with, of which the list holds the last ones. */
const DONE_SHOWN = 200;

/** The workshop's queue: all that is open, by due date, then what was cut or cancelled last. */
export async function listOrders(viewer: Viewer): Promise<OrderSummary[]> {
  if (!mayRead(viewer.role)) return [];
  return inWorkshop(viewer, async (tx) => {
    const done = ['cut', 'cancelled'] as const;
    const workshop = viewer.workshopId;
    const open = await tx.find(
      CutOrder,
      { workshop, state: { $nin: [...done] } },
      { populate: shown, orderBy: { dueOn: 'asc', number: 'asc' } },
    );
    const past = await tx.find(
      CutOrder,
      { workshop, state: { $in: [...done] } },
      { populate: shown, orderBy: { updatedAt: 'desc', id: 'asc' }, limit: DONE_SHOWN },
    );
    return toSummaries(tx, [...open, ...past]);
  });
}

/** One order of the workshop, or null: another workshop's, or no id at all. */
export async function findOrder(viewer: Viewer, id: string): Promise<Order | null> {
  if (!mayRead(viewer.role) || !idSchema.safeParse(id).success) return null;
  return inWorkshop(viewer, async (tx) => {
    const stored = await tx.findOne(CutOrder, { id, workshop: viewer.workshopId });
    return stored && toOrder(tx, viewer, stored);
  });
}

/** Released revisions with the sheets that they want, for whoever may order. */
export async function listOrderable(viewer: Viewer): Promise<Orderable[]> {
  if (!mayOrder(viewer.role)) return [];
  return inWorkshop(viewer, async (tx) => {
    const list: Orderable[] = [];
    for (const revision of await releasedRevisions(tx, viewer.workshopId)) {
      const { id, designId, designName, number, name, state } = revision;
      const wants = sheetsWanted(await revisionParts(tx, id));
      list.push({
        ...{ id, designId, designName, number, name, state },
        wants: wants.map(({ sheet: { material, thickness }, parts }) => ({
          material,
          thickness,
          sheet: sheetWords({ material, thickness }),
          parts: parts.map(({ part }) => part.label),
        })),
      });
    }
    return list;
  });
}
