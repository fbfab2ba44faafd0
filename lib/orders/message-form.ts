import 'server-only';
import { badInput, RequestError } from '../errors';
import { readForm } from '../form-body';
import { ATTACHMENT_LIMITS, writeMessageSchema } from '../schemas/order';
import { sniffFile, type SniffedFile } from './sniff-file';

export interface GivenMessage {
  readonly kind: 'remark' | 'question' | 'answer';
  readonly text: string;
  readonly version?: number | undefined;
  readonly files: readonly SniffedFile[];
}

/** Bytes of a whole form: as many files as are taken, its text, and what stands between them. */
const FORM_LIMIT = ATTACHMENT_LIMITS.bytes * ATTACHMENT_LIMITS.files + 100_000;

/** What somebody writes under an order, its files known by their bytes. @throws RequestError bad-input */
export async function readMessage(request: Request): Promise<GivenMessage> {
  const form = await readForm(request, FORM_LIMIT);
  const fields = Object.fromEntries(
    ['kind', 'text', 'version'].flatMap((name) => {
      const value = form.get(name);
      return value === null ? [] : [[name, value]];
    }),
  );
  const parsed = writeMessageSchema.safeParse(fields);
  if (!parsed.success) throw badInput(parsed.error);
  // A browser sends an empty, nameless file where none was chosen.
  const given = form
    .getAll('files')
    .filter((file) => typeof file !== 'string')
    .filter(({ name, size }) => name !== '' || size > 0);
  if (given.length > ATTACHMENT_LIMITS.files) {
    throw new RequestError(
      'bad-input',
      `Files: ${given.length} at once; send at most ${ATTACHMENT_LIMITS.files} with one message.`,
      { field: 'files' },
    );
  }
  const { text, kind } = parsed.data;
  if (text === '' && (kind !== 'remark' || given.length === 0)) {
    throw new RequestError('bad-input', `Text: empty; write the ${kind}.`, { field: 'text' });
  }
  if (text.includes('\0')) {
    throw new RequestError('bad-input', 'Text: holds a null character; take it out.', {
      field: 'text',
    });
  }
  const files: SniffedFile[] = [];
  for (const file of given) files.push(await sniffFile(file));
  return { ...parsed.data, files };
}
