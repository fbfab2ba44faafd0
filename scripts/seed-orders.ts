/**
 * Cut orders of the demo workshop, once it has a released revision: one that is overdue, one whose
 * question was answered and which is being cut, and one that waits for an answer.
 */

import { randomUUID } from 'node:crypto';
import type { EntityManager } from '@mikro-orm/postgresql';
import {
  CutOrder,
  Membership,
  OrderMessage,
  RecordEntry,
  Revision,
  ShopItem,
  type RecordVerb,
  type User,
  type Workshop,
} from '../entities';
import type { SheetValues } from '../geometry/cutting/shop-parameters';
import { partsOf } from '../geometry/parts/assembly';

const DAY = 24 * 3600 * 1000;

interface Step {
  readonly state: CutOrder['state'];
  readonly by: 'builder' | 'machinist';
  readonly what: RecordVerb;
  readonly text?: string;
}

interface Demo {
  readonly quantity: number;
  /** From the day of seeding. */
  readonly dueIn: number;
  readonly note: string;
  readonly steps: readonly Step[];
}

const asked = (text: string): Step => ({
  state: 'returned',
  by: 'machinist',
  what: 'order-returned',
  text,
});
const begun: Step = { state: 'cutting', by: 'machinist', what: 'order-begun' };

const demo: readonly Demo[] = [
  { quantity: 1, dueIn: -3, note: 'For the bench receiver; deburr both faces.', steps: [] },
  {
    quantity: 4,
    dueIn: 5,
    note: '',
    steps: [
      asked('The sheet has a scratch along one edge. May small parts lie over it?'),
      {
        state: 'queued',
        by: 'builder',
        what: 'order-answered',
        text: 'Yes, but no rotor plate: those run close.',
      },
      begun,
    ],
  },
  {
    quantity: 2,
    dueIn: 12,
    note: '',
    steps: [
      begun,
      asked('Two holes of the first piece came out tight. Ream them, or cut anew?'),
    ],
  },
];

/** A sheet of the store that some part of the revision is cut from. */
function fittingSheet(revision: Revision, items: readonly ShopItem[]): ShopItem | undefined {
  if (!revision.derivation.ok) return undefined;
  const parts = partsOf(revision.derivation.derived);
  return items.find(({ kind, values }) => {
    if (kind !== 'sheet') return false;
    const { material, thickness } = values as SheetValues;
    return parts.some(
      (part) =>
        part.kind === 'cut' && part.material === material && part.thickness === thickness,
    );
  });
}

/** Puts the orders into a workshop that holds a released revision, and fitting sheet. */
export async function addOrders(em: EntityManager, workshop: Workshop): Promise<void> {
  const members = await em.find(Membership, { workshop }, { populate: ['user'] });
  const personOf = (role: Membership['role']): User | undefined =>
    members.find((member) => member.role === role)?.user;
  const [builder, machinist] = [personOf('builder'), personOf('machinist')];
  const revision = await em.findOne(
    Revision,
    { workshop, state: 'released' },
    { orderBy: { designName: 'asc', number: 'desc' } },
  );
  const items = await em.find(ShopItem, { workshop }, { orderBy: { name: 'asc' } });
  const machine = items.find(({ kind }) => kind === 'machine');
  const sheet = revision ? fittingSheet(revision, items) : undefined;
  if (!revision || !machine || !sheet || !builder || !machinist) return;
  const people = { builder, machinist };

  demo.forEach(({ quantity, dueIn, note, steps }, index) => {
    const id = randomUUID();
    const number = index + 1;
    const dueOn = new Date(Date.now() + dueIn * DAY).toISOString().slice(0, 10);
    // Minutes apart, in the order in which they happened.
    let at = new Date(Date.now() - (demo.length - index) * 3_600_000);
    const record = (what: RecordVerb, who: User, detail: Record<string, unknown>) =>
      em.create(RecordEntry, {
        ...{ workshop, who, what, at, subject: id, revision: revision.id },
        detail: { number, ...detail },
      });
    const order = em.create(CutOrder, {
      ...{ id, workshop, number, revision, quantity, machine, sheet, sheets: 1, dueOn, note },
      ...{ state: 'queued', version: 1, orderedBy: people.builder },
      ...{ createdAt: at, updatedAt: at },
    });
    record('order-placed', people.builder, {
      ...{ quantity, sheets: 1, dueOn, note, sheet: sheet.name, machine: machine.name },
    });
    for (const { state, by, what, text } of steps) {
      at = new Date(at.getTime() + 600_000);
      const who = people[by];
      order.state = state;
      order.version += 1;
      order.updatedAt = at;
      if (what === 'order-begun') order.takenBy = who;
      const message = text === undefined ? undefined : randomUUID();
      if (text !== undefined) {
        em.create(OrderMessage, {
          ...{ id: message, workshop, order, author: who, text, createdAt: at },
          kind: what === 'order-returned' ? 'question' : 'answer',
        });
      }
      record(what, who, { version: order.version, ...(message && { message, files: [] }) });
    }
  });
}
