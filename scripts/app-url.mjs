import { createHmac } from 'node:crypto';

/**
 * The address by which the application itself asks the database of `ownerUrl`: a role of its own,
 * which owns nothing. Every process that knows the secret finds the same one. The application's
 * address itself stays as it is, so that a process which is given no more needs no more.
 */
export function appUrlOf(ownerUrl, secret) {
  const url = new URL(ownerUrl);
  const database = decodeURIComponent(url.pathname.slice(1));
  const role = `${database}_app`;
  if (decodeURIComponent(url.username) === role) return ownerUrl;
  url.username = encodeURIComponent(role);
  url.password = createHmac('sha256', secret).update(`role ${database}`).digest('base64url');
  return url.href;
}
