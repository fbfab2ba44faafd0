import { defineEntity, p, type InferEntity } from '@mikro-orm/postgresql';
import { base } from './base';
import { Revision } from './revision';
import { ShopItem } from './shop-item';
import { User } from './user';
import { Workshop } from './workshop';

/** Asks the machinist to cut a released revision. */
export const CutOrder = defineEntity({
  name: 'CutOrder',
  tableName: 'cut_orders',
  checks: [
    { name: 'cut_orders_quantity_check', expression: 'quantity > 0' },
    { name: 'cut_orders_sheets_check', expression: 'sheets >= 0' },
  ],
  uniques: [{ properties: ['workshop', 'number'] }],
  indexes: [{ properties: ['workshop', 'state', 'dueOn'] }],
  properties: {
    ...base(),
    workshop: () => p.manyToOne(Workshop),
    /** 1, 2, 3 within the workshop. */
    number: p.integer(),
    revision: () => p.manyToOne(Revision),
    /** Capacitors, each with all of the revision's parts. */
    quantity: p.integer(),
    machine: () => p.manyToOne(ShopItem),
    sheet: () => p.manyToOne(ShopItem),
    /** Sheets of the store that it takes. */
    sheets: p.integer(),
    /** As YYYY-MM-DD. */
    dueOn: p.date(),
    note: p.string().length(500),
    state: p.enum(['queued', 'cutting', 'cut', 'returned', 'cancelled']),
    /** Goes up by one at every change; a writer must name the one it began from. */
    version: p.integer().onCreate(() => 1),
    orderedBy: () => p.manyToOne(User),
    takenBy: () => p.manyToOne(User).nullable(),
    /** Parts spoilt, once cut. */
    scrap: p.integer().nullable(),
    /** Kerf that the machinist measured, mm. */
    actualKerf: p.double().$type<number>().nullable(),
    cutAt: p.datetime(3).nullable(),
    updatedAt: p.datetime(3),
  },
});
export type CutOrder = InferEntity<typeof CutOrder>;
