import 'server-only';
import { createHash, randomBytes } from 'node:crypto';

/** What a link's secret is known by in the database: from it nobody can make the link. */
export const hashSecret = (secret: string): string =>
  createHash('sha256').update(secret).digest('base64url');

/** A secret for a link, 256 bits, and its hash. */
export function makeSecret(): { secret: string; hash: string } {
  const secret = randomBytes(32).toString('base64url');
  return { secret, hash: hashSecret(secret) };
}
