import { defineEntity, p, type InferEntity } from '@mikro-orm/postgresql';
import { base } from './base';
import { CutOrder } from './cut-order';
import { User } from './user';
import { Workshop } from './workshop';

/** What somebody wrote under a cut order. */
export const OrderMessage = defineEntity({
  name: 'OrderMessage',
  tableName: 'order_messages',
  indexes: [{ properties: ['order', 'createdAt'] }],
  properties: {
    ...base(),
    workshop: () => p.manyToOne(Workshop),
    order: () => p.manyToOne(CutOrder),
    author: () => p.manyToOne(User),
    /** A question returns the order to the builder; an answer puts it back into the queue. */
    kind: p.enum(['remark', 'question', 'answer']),
    text: p.string().length(2000),
  },
});
export type OrderMessage = InferEntity<typeof OrderMessage>;
