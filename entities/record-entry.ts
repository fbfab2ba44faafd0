import { defineEntity, p, type InferEntity } from '@mikro-orm/postgresql';
import { User } from './user';
import { Workshop } from './workshop';

/** What can be done, as the record names it. */
export type RecordVerb =
  | 'workshop-opened'
  | 'member-invited'
  | 'invitation-withdrawn'
  | 'member-joined'
  | 'member-role-set'
  | 'member-removed'
  | 'design-created'
  | 'design-saved'
  | 'design-restored'
  | 'design-status-set'
  | 'design-deleted'
  | 'revision-named'
  | 'review-asked'
  | 'review-refused'
  | 'revision-released'
  | 'revision-superseded'
  | 'revision-withdrawn'
  | 'file-downloaded'
  | 'item-created'
  | 'item-saved'
  | 'item-deleted'
  | 'stock-drawn'
  | 'order-placed'
  | 'order-changed'
  | 'order-begun'
  | 'order-returned'
  | 'order-answered'
  | 'order-remarked'
  | 'order-cut'
  | 'order-cancelled';

/** Who did what, in order. The database refuses to change or take away a row. */
export const RecordEntry = defineEntity({
  name: 'RecordEntry',
  tableName: 'record_entries',
  indexes: [
    { properties: ['workshop', 'at'] },
    { properties: ['subject'] },
    { properties: ['revision'] },
  ],
  properties: {
    id: p.bigint('string').primary().autoincrement(),
    at: p.datetime(3).onCreate(() => new Date()),
    workshop: () => p.manyToOne(Workshop),
    who: () => p.manyToOne(User),
    what: p.string().length(40).$type<RecordVerb>(),
    /** Id of the design, order, item, person or workshop it was done to. */
    subject: p.uuid(),
    /** The revision it was done to or with, where there is one. */
    revision: p.uuid().nullable(),
    detail: p.json<Record<string, unknown>>(),
  },
});
export type RecordEntry = InferEntity<typeof RecordEntry>;
