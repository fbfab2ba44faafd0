import { defineEntity, p, type InferEntity } from '@mikro-orm/postgresql';
import { base } from './base';
import { Workshop } from './workshop';

/**
 * One mail to one person, written in the transaction of what it tells of. The database puts it
 * into the queue by itself; scripts/worker.ts sends it.
 */
export const Mail = defineEntity({
  name: 'Mail',
  tableName: 'mails',
  // One event never makes two mails to one address.
  uniques: [{ properties: ['event', 'toAddress'] }],
  indexes: [{ properties: ['workshop', 'createdAt'] }],
  properties: {
    ...base(),
    /** None for a password reset, which belongs to a person. */
    workshop: () => p.manyToOne(Workshop).nullable(),
    kind: p.string().length(40),
    /** What it tells of, as `order-placed:<id>`. */
    event: p.string().length(120),
    toAddress: p.string().length(254),
    subject: p.string().length(200),
    /** Taken away once sent where it holds a link that opens something. */
    text: p.text(),
    html: p.text(),
    /** Holds a link that opens something: its words are not kept once it is sent. */
    secret: p.boolean().onCreate(() => false),
    attempts: p.integer().onCreate(() => 0),
    lastError: p.string().length(300).nullable(),
    sentAt: p.datetime(3).nullable(),
  },
});
export type Mail = InferEntity<typeof Mail>;
