import 'server-only';
import { createHash } from 'node:crypto';
import { fileTypeFromBuffer } from 'file-type';
import { RequestError } from '../errors';
import { ATTACHMENT_LIMITS } from '../schemas/order';

/** A file whose own bytes say that it is what its name says. */
export interface SniffedFile {
  readonly name: string;
  readonly mediaType: string;
  readonly sha256: string;
  readonly body: Buffer;
}

interface Kind {
  readonly words: string;
  readonly endings: readonly string[];
  readonly mediaType: string;
  /** As the bytes say; text has no mark of its own. */
  readonly sniffed: readonly string[] | 'text';
}

const kinds: readonly Kind[] = [
  { words: 'PNG', endings: ['png'], mediaType: 'image/png', sniffed: ['image/png'] },
  { words: 'JPEG', endings: ['jpg', 'jpeg'], mediaType: 'image/jpeg', sniffed: ['image/jpeg'] },
  { words: 'WebP', endings: ['webp'], mediaType: 'image/webp', sniffed: ['image/webp'] },
  {
    words: 'HEIC',
    endings: ['heic', 'heif'],
    mediaType: 'image/heic',
    sniffed: ['image/heic', 'image/heif', 'image/heic-sequence'],
  },
  {
    words: 'PDF',
    endings: ['pdf'],
    mediaType: 'application/pdf',
    sniffed: ['application/pdf'],
  },
  { words: 'DXF', endings: ['dxf'], mediaType: 'image/vnd.dxf', sniffed: 'text' },
  { words: 'CSV', endings: ['csv'], mediaType: 'text/csv', sniffed: 'text' },
  { words: 'plain text', endings: ['txt'], mediaType: 'text/plain', sniffed: 'text' },
];
const taken = 'PNG, JPEG, WebP, HEIC, PDF, DXF, CSV or plain text';

/** What a browser may show in its place; everything else is saved. */
export const isShown = (mediaType: string): boolean =>
  ['image/png', 'image/jpeg', 'image/webp'].includes(mediaType);

/** The last part of a path, on one line, without what turns the way of reading. */
export function plainName(given: string): string {
  const last = given.normalize('NFC').split(/[\\/]/).at(-1)!;
  const name = last.replace(/[\p{Cc}\p{Cf}]/gu, '').trim();
  if (name.length <= 120) return name || 'file';
  const ending = /\.\w{1,5}$/.exec(name)?.[0] ?? '';
  return name.slice(0, 120 - ending.length) + ending;
}

/** Neither control characters nor the beginning of markup, which a browser might run. */
function isPlainText(body: Buffer): boolean {
  if (body.some((byte) => byte < 32 && ![9, 10, 12, 13].includes(byte))) return false;
  const start = body.subarray(0, 4096).toString('latin1');
  return (
    !/^(?:\u00ef\u00bb\u00bf)?\s*</.test(start) && !/<(?:!doctype|html|svg|script)/i.test(start)
  );
}

/** Comments, then the first section, as every DXF in text begins. */
const DXF = /^(?:\u00ef\u00bb\u00bf)?(?:\s*999\r?\n[^\n]*\n)*\s*0\r?\n\s*SECTION\r?\n/;

async function holds(kind: Kind, body: Buffer): Promise<boolean> {
  const sniffed = await fileTypeFromBuffer(body);
  if (kind.sniffed !== 'text') return kind.sniffed.includes(sniffed?.mime ?? '');
  if (sniffed || !isPlainText(body)) return false;
  return kind.words !== 'DXF' || DXF.test(body.subarray(0, 65_536).toString('latin1'));
}

/** @throws RequestError bad-input for a file too large, of a kind not taken, or not what it says */
export async function sniffFile(given: File): Promise<SniffedFile> {
  const name = plainName(given.name);
  const refuse = (why: string) =>
    new RequestError('bad-input', `${name}: ${why}`, { field: 'files' });
  if (given.size === 0) throw refuse('it is empty; choose it again.');
  if (given.size > ATTACHMENT_LIMITS.bytes) {
    throw refuse(
      `larger than ${ATTACHMENT_LIMITS.bytes / 1e6} MB; make it smaller, or send it in parts.`,
    );
  }
  const ending = /\.([^.]+)$/.exec(name)?.[1]?.toLowerCase() ?? '';
  const kind = kinds.find(({ endings }) => endings.includes(ending));
  if (!kind) throw refuse(`of a kind that is not taken; send ${taken}.`);
  const body = Buffer.from(await given.arrayBuffer());
  if (!(await holds(kind, body))) {
    throw refuse(`its bytes are not ${kind.words}; send ${taken}, named as what it is.`);
  }
  const sha256 = createHash('sha256').update(body).digest('hex');
  return { name, mediaType: kind.mediaType, sha256, body };
}
