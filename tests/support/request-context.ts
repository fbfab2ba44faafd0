/**
 * Stands in for next/headers, which only works inside Next's server: the cookies and headers of
 * the request that a test is making. The guard that reads them is the real one.
 */

import { vi } from 'vitest';

const store = globalThis as typeof globalThis & { askedHeaders?: Headers };

/** Everything asked from now on comes with these headers. */
export function askWith(headers: Record<string, string>): void {
  store.askedHeaders = new Headers(headers);
}

vi.mock('next/headers', () => {
  const current = () => store.askedHeaders ?? new Headers();
  const cookies = () =>
    (current().get('cookie') ?? '')
      .split('; ')
      .filter(Boolean)
      .map((pair) => {
        const at = pair.indexOf('=');
        return { name: pair.slice(0, at), value: pair.slice(at + 1) };
      });
  return {
    headers: () => Promise.resolve(current()),
    cookies: () => Promise.resolve({ getAll: cookies }),
  };
});
