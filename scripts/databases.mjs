/** The database's two addresses: its owner's, and the application's. */

import { appUrlOf } from './app-url.mjs';
import { startPostgres } from './postgres.mjs';
import { secret } from './secret.mjs';
import { Stop } from './stop.mjs';

/** Is the database somebody else's to run? */
export const isGiven = () => Boolean(process.env.DATABASE_URL);

/**
 * Of the database that is given, or of our own cluster: the address of the owner, who migrates,
 * sends mail and makes backups, and that of the application, whose role the migration makes.
 * @param borrow leave a cluster of ours that runs already running when this process ends
 */
export async function databases({ borrow = false } = {}) {
  const { DATABASE_URL: given, OWNER_DATABASE_URL: ownerGiven } = process.env;
  if (ownerGiven) {
    if (!given) throw new Stop('OWNER_DATABASE_URL is given, but no DATABASE_URL beside it.');
    return { OWNER_DATABASE_URL: ownerGiven, DATABASE_URL: given };
  }
  const owner = given ?? (await startPostgres({ borrow })).ensureDatabase('vaneloft');
  return { OWNER_DATABASE_URL: owner, DATABASE_URL: appUrlOf(owner, secret()) };
}
