import 'server-only';
import type { EntityManager } from '@mikro-orm/postgresql';
import { RecordEntry, User, Workshop, type RecordVerb } from '@/entities';

interface Entry {
  readonly what: RecordVerb;
  readonly subject: string;
  /** The revision it was done to or with. */
  readonly revision?: string;
  readonly detail: Record<string, unknown>;
}

/** Puts a row into the record, in the transaction that `tx` is in. */
export function addRecord(
  tx: EntityManager,
  by: { readonly workshopId: string; readonly userId: string },
  { revision, ...entry }: Entry,
): void {
  tx.create(RecordEntry, {
    ...entry,
    revision: revision ?? null,
    workshop: tx.getReference(Workshop, by.workshopId),
    who: tx.getReference(User, by.userId),
  });
}
