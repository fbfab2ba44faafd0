import 'server-only';
import type { EntityManager } from '@mikro-orm/postgresql';
import { RecordEntry, User, Workshop } from '@/entities';

interface Entry {
  workshopId: string;
  who: string;
  what: RecordEntry['what'];
  subject: string;
  detail: Record<string, unknown>;
}

/** Puts a row into the record, in the transaction that `tx` is in. */
export function addRecord(tx: EntityManager, entry: Entry): void {
  const { workshopId, who, ...rest } = entry;
  tx.create(RecordEntry, {
    ...rest,
    workshop: tx.getReference(Workshop, workshopId),
    who: tx.getReference(User, who),
  });
}
