import 'server-only';
import type { EntityManager } from '@mikro-orm/postgresql';
import { Mail, Workshop } from '@/entities';
import { writeLetter, type Letter } from './letter';

interface NewMail {
  /** None for a password reset, which belongs to a person. */
  readonly workshopId: string | null;
  readonly kind: string;
  /** Names what happened, once for good: the same event never makes two mails to one address. */
  readonly event: string;
  readonly to: string;
  readonly letter: Letter;
  /** The link opens something: the words are forgotten once they are sent. */
  readonly secret?: boolean;
}

/** Writes a mail in the transaction of what it tells of; the database queues it with the commit. */
export function addMail(
  tx: EntityManager,
  { workshopId, kind, event, to, letter, secret = false }: NewMail,
): void {
  tx.create(Mail, {
    workshop: workshopId === null ? null : tx.getReference(Workshop, workshopId),
    kind,
    event,
    toAddress: to,
    secret,
    ...writeLetter(letter),
  });
}
