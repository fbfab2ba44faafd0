import { defineEntity, p, type InferEntity } from '@mikro-orm/postgresql';
import { User } from './user';
import { Workshop } from './workshop';

/** Who did what, in order. The database refuses to change or take away a row. */
export const RecordEntry = defineEntity({
  name: 'RecordEntry',
  tableName: 'record_entries',
  indexes: [{ properties: ['workshop', 'at'] }, { properties: ['subject'] }],
  properties: {
    id: p.bigint('string').primary().autoincrement(),
    at: p.datetime(3).onCreate(() => new Date()),
    workshop: () => p.manyToOne(Workshop),
    who: () => p.manyToOne(User),
    what: p.enum([
      'workshop-opened',
      'design-created',
      'design-saved',
      'design-status-set',
      'design-deleted',
      'file-downloaded',
      'item-created',
      'item-saved',
      'item-deleted',
    ]),
    /** Id of the design or workshop it was done to. */
    subject: p.uuid(),
    detail: p.json<Record<string, unknown>>(),
  },
});
export type RecordEntry = InferEntity<typeof RecordEntry>;
