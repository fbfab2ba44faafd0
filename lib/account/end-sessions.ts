import 'server-only';
import { within } from '../db';
import { requirePerson } from './person';

/** Ends every session of the person who asks, this one too. */
export async function endSessions(): Promise<void> {
  const { userId } = await requirePerson();
  await within({ user: userId }, (tx) =>
    tx.execute('update users set session_epoch = session_epoch + 1 where id = ?', [userId]),
  );
}
