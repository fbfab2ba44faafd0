import { randomUUID } from 'node:crypto';
import { p } from '@mikro-orm/postgresql';

/** What every row has. A function, because a property builder belongs to one entity only. */
export function base() {
  return {
    id: p
      .uuid()
      .primary()
      .onCreate(() => randomUUID()),
    createdAt: p.datetime(3).onCreate(() => new Date()),
  };
}
