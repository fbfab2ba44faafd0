import 'server-only';
import { env } from './env';
import { errorResponse, RequestError } from './errors';
import { log } from './log';

/**
 * A write from another site's page is refused before anything is looked at. Browsers name the
 * origin with every write; what names none is no browser, and brings no cookie of its own accord.
 */
function refuseForeignOrigin(request: Request): void {
  const origin = request.headers.get('origin');
  const site = request.headers.get('sec-fetch-site');
  if (origin === null && (site === null || site === 'same-origin' || site === 'none')) return;
  const host = request.headers.get('x-forwarded-host') ?? request.headers.get('host');
  const from = origin !== null && URL.canParse(origin) ? new URL(origin).host : null;
  if (from !== null && (from === host || from === new URL(env().NEXTAUTH_URL).host)) return;
  throw new RequestError('not-allowed', 'This request came from another site; it was refused.');
}

type Handler<P> = (request: Request, params: P) => Promise<Response>;

/** What every route does round its own work: origin, errors to responses, one line in the log. */
export function route<P>(handler: Handler<P>) {
  return async (request: Request, context: { params: Promise<P> }): Promise<Response> => {
    const started = performance.now();
    let response: Response;
    try {
      if (request.method !== 'GET' && request.method !== 'HEAD') refuseForeignOrigin(request);
      response = await handler(request, await context.params);
    } catch (error) {
      response = errorResponse(error);
    }
    log.info(
      {
        method: request.method,
        path: new URL(request.url).pathname,
        status: response.status,
        ms: Math.round(performance.now() - started),
      },
      'request',
    );
    return response;
  };
}

/** A success in JSON. Never kept by a cache: it is one person's view of one moment. */
export function json(body: unknown, status = 200): Response {
  return Response.json(body, { status, headers: { 'Cache-Control': 'no-store' } });
}
