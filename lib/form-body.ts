import 'server-only';
import { RequestError } from './errors';

/** All of a body, or a refusal as soon as it is larger than the limit. */
async function readBytes(request: Request, limit: number): Promise<Buffer> {
  const tooLarge = () =>
    new RequestError('bad-input', `Request: larger than ${limit / 1e6} MB; send less at once.`);
  if (Number(request.headers.get('content-length') ?? 0) > limit) throw tooLarge();
  const chunks: Uint8Array[] = [];
  let size = 0;
  // Counted as it comes: the header may be missing or wrong.
  for await (const chunk of (request.body ?? []) as unknown as AsyncIterable<Uint8Array>) {
    size += chunk.byteLength;
    if (size > limit) throw tooLarge();
    chunks.push(chunk);
  }
  return Buffer.concat(chunks, size);
}

/**
 * A form with files. @param limit bytes of the whole body
 * @throws RequestError bad-input: other type, too large, or not a form that can be read
 */
export async function readForm(request: Request, limit: number): Promise<FormData> {
  const type = request.headers.get('content-type') ?? '';
  if (!/^multipart\/form-data\b/i.test(type)) {
    throw new RequestError(
      'bad-input',
      'Request: not a form; send Content-Type multipart/form-data.',
    );
  }
  const body = await readBytes(request, limit);
  try {
    return await new Response(new Uint8Array(body), {
      headers: { 'content-type': type },
    }).formData();
  } catch (error) {
    if (!(error instanceof TypeError)) throw error;
    throw new RequestError('bad-input', 'Request: not a form that can be read; send it again.');
  }
}
