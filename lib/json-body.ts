import 'server-only';
import { RequestError } from './errors';

/** Largest request body taken. A design of four sections is about 4 kB. */
const BODY_LIMIT = 64 * 1024;

async function readText(request: Request): Promise<string> {
  const tooLarge = () =>
    new RequestError(
      'bad-input',
      `Request: larger than ${BODY_LIMIT / 1024} kB; send one design.`,
    );
  if (Number(request.headers.get('content-length') ?? 0) > BODY_LIMIT) throw tooLarge();
  if (!request.body) return '';
  const decoder = new TextDecoder();
  let text = '';
  let size = 0;
  // Counted as it comes: the header may be missing or wrong.
  for await (const chunk of request.body as unknown as AsyncIterable<Uint8Array>) {
    size += chunk.byteLength;
    if (size > BODY_LIMIT) throw tooLarge();
    text += decoder.decode(chunk, { stream: true });
  }
  return text + decoder.decode();
}

/** The JSON of a request. @throws RequestError bad-input: other type, too large, not JSON. */
export async function readJson(request: Request): Promise<unknown> {
  if (!/^application\/json\b/i.test(request.headers.get('content-type') ?? '')) {
    throw new RequestError(
      'bad-input',
      'Request: not JSON; send Content-Type application/json.',
    );
  }
  const text = await readText(request);
  if (text.includes('\\u0000')) {
    throw new RequestError('bad-input', 'Request: holds a null character; take it out.');
  }
  try {
    return JSON.parse(text);
  } catch (error) {
    if (!(error instanceof SyntaxError)) throw error;
    throw new RequestError(
      'bad-input',
      'Request: not JSON that can be read; check its syntax.',
    );
  }
}
