import { defineEntity, p, type InferEntity } from '@mikro-orm/postgresql';
import { base } from './base';
import { OrderMessage } from './order-message';
import { Workshop } from './workshop';

/** A photo or file under a message, bytes and all. */
export const Attachment = defineEntity({
  name: 'Attachment',
  tableName: 'attachments',
  properties: {
    ...base(),
    workshop: () => p.manyToOne(Workshop),
    message: () => p.manyToOne(OrderMessage).index(),
    name: p.string().length(200),
    /** As its own bytes say, not as the sender did. */
    mediaType: p.string().length(100),
    bytes: p.integer(),
    sha256: p.string().length(64),
    body: p.blob().lazy(),
  },
});
export type Attachment = InferEntity<typeof Attachment>;
