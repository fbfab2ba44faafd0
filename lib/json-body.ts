import 'server-only';
import { RequestError } from './errors';

/** Largest request body taken. A design of four sections is about 4 kB. */
const BODY_LIMIT = 64 * 1024;

/** The same for a layout on sheets: about 100 bytes a part. */
export const LAYOUT_LIMIT = 1024 * 1024;

/** Levels of objects and lists taken. A design has four. */
const DEPTH_LIMIT = 16;

async function readText(request: Request, limit: number): Promise<string> {
  const tooLarge = () =>
    new RequestError(
      'bad-input',
      `Request: larger than ${limit / 1024} kB; send less at once.`,
    );
  if (Number(request.headers.get('content-length') ?? 0) > limit) throw tooLarge();
  if (!request.body) return '';
  const decoder = new TextDecoder();
  let text = '';
  let size = 0;
  // Counted as it comes: the header may be missing or wrong.
  for await (const chunk of request.body as unknown as AsyncIterable<Uint8Array>) {
    size += chunk.byteLength;
    if (size > limit) throw tooLarge();
    text += decoder.decode(chunk, { stream: true });
  }
  return text + decoder.decode();
}

/** The JSON of a request. @throws RequestError bad-input: other type, too large or deep, not JSON. */
export async function readJson(request: Request, limit = BODY_LIMIT): Promise<unknown> {
  if (!/^application\/json\b/i.test(request.headers.get('content-type') ?? '')) {
    throw new RequestError(
      'bad-input',
      'Request: not JSON; send Content-Type application/json.',
    );
  }
  const text = await readText(request, limit);
  let body: unknown;
  try {
    body = JSON.parse(text);
  } catch (error) {
    if (!(error instanceof SyntaxError)) throw error;
    throw new RequestError(
      'bad-input',
      'Request: not JSON that can be read; check its syntax.',
    );
  }
  refuseUnstorable(body, DEPTH_LIMIT);
  return body;
}

/** What is JSON, but can be neither written back nor kept by the database. */
function refuseUnstorable(value: unknown, levels: number): void {
  if (typeof value === 'string' && value.includes('\0')) {
    throw new RequestError('bad-input', 'Request: holds a null character; take it out.');
  }
  if (typeof value !== 'object' || value === null) return;
  if (levels === 0) {
    throw new RequestError('bad-input', `Request: more than ${DEPTH_LIMIT} levels deep.`);
  }
  for (const item of Object.values(value)) refuseUnstorable(item, levels - 1);
}
