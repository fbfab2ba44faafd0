import { createHmac } from 'node:crypto';

/**
 * The address by which the application itself asks the database of `ownerUrl`: a role of its own,
 * which owns nothing. Every process that knows the secret finds the same one.
 */
export function appUrlOf(ownerUrl, secret) {
  const url = new URL(ownerUrl);
  const database = decodeURIComponent(url.pathname.slice(1));
  url.username = encodeURIComponent(`${database}_app`);
  url.password = createHmac('sha256', secret).update(`role ${database}`).digest('base64url');
  return url.href;
}
