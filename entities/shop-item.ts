import { defineEntity, p, type InferEntity } from '@mikro-orm/postgresql';
import type { MachineValues, SheetValues } from '@/geometry/cutting/shop-parameters';
import { base } from './base';
import { User } from './user';
import { Workshop } from './workshop';

/** A machine of the workshop, or sheet in its store. */
export const ShopItem = defineEntity({
  name: 'ShopItem',
  tableName: 'shop_items',
  indexes: [{ properties: ['workshop', 'kind'] }],
  checks: [
    {
      // The store is never less than empty, whoever draws from it.
      name: 'shop_items_count_check',
      expression: `kind <> 'sheet' or (values->>'count')::numeric >= 0`,
    },
  ],
  properties: {
    ...base(),
    workshop: () => p.manyToOne(Workshop),
    kind: p.enum(['machine', 'sheet']),
    name: p.string().length(80),
    /** Goes up by one at every change; a writer must name the one it began from. */
    version: p.integer().default(1),
    values: p.json<MachineValues | SheetValues>(),
    updatedBy: () => p.manyToOne(User),
    updatedAt: p.datetime(3),
    /** Set when deleted; the row stays, for the record's sake. */
    deletedAt: p.datetime(3).nullable(),
  },
});
export type ShopItem = InferEntity<typeof ShopItem>;
