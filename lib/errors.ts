import 'server-only';
import type { z } from 'zod';
import type { ApiErrorCode, Current } from './schemas/api';
import { log } from './log';

/** A refusal with words for the person who asked. Everything else is answered as `internal`. */
export class RequestError extends Error {
  readonly code: ApiErrorCode;
  readonly field: string | undefined;
  readonly current: Current | undefined;

  constructor(
    code: ApiErrorCode,
    message: string,
    options: { field?: string; current?: Current; cause?: unknown } = {},
  ) {
    super(message, { cause: options.cause });
    this.name = 'RequestError';
    this.code = code;
    this.field = options.field;
    this.current = options.current;
  }
}

type Noun = 'design' | 'revision' | 'machine' | 'sheet' | 'order' | 'attachment';

export const notFound = (what: Noun = 'design') =>
  new RequestError('not-found', `No such ${what} in your workshop; it may have been deleted.`);

const statuses: Record<ApiErrorCode, number> = {
  'bad-input': 422,
  'not-signed-in': 401,
  'not-allowed': 403,
  'not-found': 404,
  conflict: 409,
  'checks-fail': 422,
  withdrawn: 410,
  'too-many': 429,
  unavailable: 503,
  internal: 500,
};

/** The first thing that zod found wrong, as a refusal. */
export function badInput(error: z.ZodError): RequestError {
  const issue = error.issues[0]!;
  const field = issue.path.map(String).filter(Boolean).join('.');
  // Messages of ours begin with the field's label; zod's own get the path.
  const message = issue.code === 'custom' || /^(?!Invalid )[A-Z][\w ]*: /.test(issue.message);
  return new RequestError(
    'bad-input',
    message || !field ? issue.message : `${field}: ${issue.message}`,
    field ? { field } : {},
  );
}

/** PostgreSQL's classes 08 (connection), 53 (resources), 57P (shutdown), and the socket's own. */
const GONE =
  /^(08...|53...|57P0.|ECONNREFUSED|ECONNRESET|ENOTFOUND|ETIMEDOUT|EPIPE|EAI_AGAIN)$/;
const GONE_WORDS =
  /timeout|Connection terminated|connection error|Client was closed|Transaction query already complete|connection is not open|Unable to acquire|Knex: Timeout/i;

function isDatabaseGone(error: unknown): boolean {
  for (let at: unknown = error, depth = 0; at instanceof Error && depth < 5; depth++) {
    const code: unknown = Reflect.get(at, 'code');
    if (typeof code === 'string' && GONE.test(code)) return true;
    if (/Knex|Pool|Driver|Connection|Error/.test(at.name) && GONE_WORDS.test(at.message))
      return true;
    at = at.cause ?? Reflect.get(at, 'previous');
  }
  return false;
}

/** Turns anything thrown into a refusal that may be shown; what isn't one is logged with its cause. */
export function toRequestError(error: unknown): RequestError {
  if (error instanceof RequestError) {
    if (error.cause !== undefined) log.error({ err: error.cause }, error.message);
    return error;
  }
  if (isDatabaseGone(error)) {
    log.error({ err: error }, 'database unavailable');
    return new RequestError(
      'unavailable',
      'The database does not answer; nothing was changed. Try again in a moment.',
    );
  }
  log.error({ err: error }, 'request failed');
  return new RequestError(
    'internal',
    'Something went wrong here; nothing was changed. Try again.',
  );
}

/** The one place where an error becomes a response. */
export function errorResponse(error: unknown): Response {
  const { code, message, field, current } = toRequestError(error);
  return Response.json(
    { error: { code, message, ...(field && { field }) }, ...(current && { current }) },
    { status: statuses[code], headers: { 'Cache-Control': 'no-store' } },
  );
}
