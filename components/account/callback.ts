/** Where to go after signing in: a path of this site only, never another site's address. */
export function safeCallback(callbackUrl: string | undefined, origin: string): string {
  if (!callbackUrl) return '/designs';
  try {
    const url = new URL(callbackUrl, origin);
    return url.origin === origin ? url.pathname + url.search : '/designs';
  } catch {
    return '/designs';
  }
}
