/** Photos and files under an order: known by their bytes, bounded, and for members alone. */

import { createHash } from 'node:crypto';
import { crc32, deflateSync } from 'node:zlib';
import { beforeAll, describe, expect, test } from 'vitest';
import { GET } from '@/app/api/attachments/[id]/route';
import { POST as WRITE } from '@/app/api/orders/[id]/messages/route';
import { Attachment, RecordEntry } from '@/entities';
import { defaultDesign, derive } from '@/geometry';
import { cutFiles } from '@/geometry/files';
import { entityManager } from '../support/as-owner';
import { call, refusal } from '../support/call';
import { Cast } from '../support/cast';
import {
  addMachine,
  addSheet,
  formOf,
  get,
  orderIn,
  orderIs,
  termsOf,
  write,
} from '../support/orders';
import { revisionOf } from '../support/released';

let cast: Cast;
let order: string;
let place: () => Promise<string>;

beforeAll(async () => {
  cast = await Cast.gather();
  const revision = await revisionOf(cast, await cast.design(), 1);
  const terms = termsOf(revision, await addSheet(cast), await addMachine(cast));
  place = async () => (await orderIs(cast, 'queued', terms)).id;
  order = await place();
});

function chunk(type: string, data: Buffer): Buffer {
  const body = Buffer.concat([Buffer.from(type, 'latin1'), data]);
  const [length, sum] = [Buffer.alloc(4), Buffer.alloc(4)];
  length.writeUInt32BE(data.length);
  sum.writeUInt32BE(crc32(body));
  return Buffer.concat([length, body, sum]);
}

/** A whole PNG of one grey point, with padding in a text chunk up to a size. */
function png(size = 0): Buffer {
  const head = Buffer.from([0, 0, 0, 1, 0, 0, 0, 1, 8, 0, 0, 0, 0]);
  const parts = [
    Buffer.from([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a]),
    chunk('IHDR', head),
    chunk('IDAT', deflateSync(Buffer.from([0, 128]))),
    chunk('IEND', Buffer.alloc(0)),
  ];
  const rest = size - Buffer.concat(parts).length - 12;
  if (rest > 0) parts.splice(2, 0, chunk('tEXt', Buffer.alloc(rest, 'a')));
  return Buffer.concat(parts);
}
const jpeg = Buffer.concat([
  Buffer.from([0xff, 0xd8, 0xff, 0xe0, 0, 16]),
  Buffer.from('JFIF\0\x01\x01\0\0\x01\0\x01\0\0', 'latin1'),
  Buffer.from([0xff, 0xd9]),
]);
const webp = Buffer.from(
  'RIFF\x1a\0\0\0WEBPVP8L\x0d\0\0\0\x2f\0\0\0\x10\x07\x10\x11\x11\x88\x88\xfe\x07\0',
  'latin1',
);
const heic = Buffer.from('\0\0\0\x18ftypheic\0\0\0\0mif1heic', 'latin1');
const pdf = Buffer.from('%PDF-1.7\n1 0 obj\n<< >>\nendobj\ntrailer\n<< >>\n%%EOF\n', 'latin1');
const dxf = '  0\r\nSECTION\r\n  2\r\nENTITIES\r\n  0\r\nENDSEC\r\n  0\r\nEOF\r\n';
const html = '<!doctype html><script>alert(1)</script>';
const svg = '<svg xmlns="http://www.w3.org/2000/svg"><script>alert(1)</script></svg>';

const fileOf = (name: string, body: Buffer | string, type = '') =>
  new File([typeof body === 'string' ? body : new Uint8Array(body)], name, { type });
const send = (files: readonly File[], to = order) =>
  write(to, { kind: 'remark', text: 'See' }, files);
const attachedTo = async (response: Response) =>
  (await orderIn(response)).messages.at(-1)!.attachments;
const countAll = async () => {
  const em = await entityManager();
  return [await em.count(Attachment), await em.count(RecordEntry)];
};

describe('what is taken', () => {
  test.each([
    ['burr.png', png(), 'image/png', true],
    ['Burr 2.JPG', jpeg, 'image/jpeg', true],
    ['burr.jpeg', jpeg, 'image/jpeg', true],
    ['burr.webp', webp, 'image/webp', true],
    ['burr.heic', heic, 'image/heic', false],
    ['drawing.pdf', pdf, 'application/pdf', false],
    ['slot.dxf', dxf, 'image/vnd.dxf', false],
    ['slot.DXF', `999\r\nby hand\r\n${dxf}`, 'image/vnd.dxf', false],
    ['measured.csv', 'angle,pF\r\n0,12.5\r\n', 'text/csv', false],
    ['notes.txt', 'Kerf ≤ 0.2 mm: 5 < 6', 'text/plain', false],
  ])('%s, whatever the sender calls it', async (name, body, mediaType, shown) => {
    cast.ask('machinist');
    const [attached] = await attachedTo(await send([fileOf(name, body, 'text/html')]));
    const bytes = Buffer.from(body);
    expect(attached).toMatchObject({ name, mediaType, bytes: bytes.length, shown });

    const response = await call(GET, { id: attached!.id });
    expect(response.status).toBe(200);
    expect(Buffer.from(await response.arrayBuffer()).equals(bytes)).toBe(true);
    const { headers } = response;
    expect(headers.get('content-type')).toBe(mediaType);
    expect(headers.get('x-content-type-options')).toBe('nosniff');
    expect(headers.get('content-security-policy')).toBe("default-src 'none'; sandbox");
    expect(headers.get('content-disposition')).toMatch(shown ? /^inline;/ : /^attachment;/);
    expect(headers.get('cache-control')).toContain('private');
    const sha256 = createHash('sha256').update(bytes).digest('hex');
    expect(headers.get('etag')).toBe(`"${sha256}"`);
    const stored = await (await entityManager()).findOneOrFail(Attachment, attached!.id);
    expect(stored.sha256).toBe(sha256);
    const [row] = (await cast.record(order)).slice(-1);
    expect(row!.detail.files).toEqual([{ name, sha256, bytes: bytes.length }]);
  });

  test('our own DXF, whole', async () => {
    const derivation = derive(defaultDesign());
    if (!derivation.ok) throw new Error('the default design has no plates');
    const ours = cutFiles('Bench', derivation.derived).find(({ kind }) => kind === 'dxf')!;
    cast.ask('builder');
    const [attached] = await attachedTo(await send([fileOf(ours.name, ours.text)]));
    expect(attached!.mediaType).toBe('image/vnd.dxf');
  });

  test('a name as the end of a path, on one line, its ending kept', async () => {
    cast.ask('builder');
    const names = [
      'C:\\fakepath\\burr.png',
      '../../etc/burr\n.png',
      `\u202e${'é'.repeat(300)}.png`,
    ];
    const attached = await attachedTo(await send(names.map((name) => fileOf(name, png()))));
    const written = attached.map(({ name }) => name);
    expect(written).toEqual(['burr.png', 'burr.png', `${'é'.repeat(116)}.png`]);
    for (const { id } of attached) {
      const response = await call(GET, { id });
      expect(response.headers.get('content-disposition')).not.toMatch(/[\r\n]/);
    }
  });
});

describe('what is refused, before anything is kept', () => {
  test.each([
    ['HTML named as a picture', 'burr.png', html, 'burr.png: its bytes are not PNG'],
    ['HTML named as text', 'notes.txt', html, 'not plain text'],
    ['HTML behind a byte-order mark', 'notes.txt', `\ufeff \n${html}`, 'not plain text'],
    ['HTML further down', 'notes.txt', `Notes\n${html}`, 'not plain text'],
    ['SVG', 'plate.svg', svg, 'of a kind that is not taken'],
    ['SVG named as text', 'plate.txt', svg, 'not plain text'],
    ['HTML', 'page.html', html, 'of a kind that is not taken'],
    ['HTML named as DXF', 'plate.dxf', html, 'not DXF'],
    ['any text named as DXF', 'plate.dxf', 'hello', 'not DXF'],
    ['a picture named as another', 'burr.jpg', png(), 'not JPEG'],
    [
      'a program named as a picture',
      'burr.png',
      Buffer.from('MZ\x90\0\x03', 'latin1'),
      'not PNG',
    ],
    ['a PDF named as text', 'notes.txt', pdf, 'not plain text'],
    ['bytes named as text', 'notes.csv', Buffer.from([0, 1, 2, 3]), 'not CSV'],
    ['no ending', 'burr', png(), 'of a kind that is not taken'],
    ['nothing in it', 'burr.png', '', 'empty'],
  ])('%s', async (_what, name, body, words) => {
    cast.ask('machinist');
    const before = await countAll();
    const response = await send([fileOf('good.png', png()), fileOf(name, body, 'image/png')]);
    expect(response.status).toBe(422);
    const error = await refusal(response);
    expect(error).toMatchObject({ code: 'bad-input', field: 'files' });
    expect(error.message).toContain(words);
    expect(await countAll()).toEqual(before);
  });

  test('a file over 5 MB; one of exactly that is taken', async () => {
    const id = await place();
    cast.ask('machinist');
    const over = await send([fileOf('large.png', png(5_000_001))], id);
    expect((await refusal(over)).message).toBe(
      'large.png: larger than 5 MB; make it smaller, or send it in parts.',
    );
    expect((await send([fileOf('large.png', png(5_000_000))], id)).status).toBe(201);
  });

  test('more than four at once', async () => {
    cast.ask('machinist');
    const five = Array.from({ length: 5 }, (_, index) => fileOf(`${index}.png`, png()));
    expect((await refusal(await send(five))).message).toContain('5 at once; send at most 4');
    expect((await send(five.slice(1))).status).toBe(201);
  });

  test('more than 25 MB under one order, also when two send at once', async () => {
    const id = await place();
    cast.ask('machinist');
    const large = (name: string) => fileOf(`${name}.png`, png(4_500_000));
    expect((await send(['a', 'b', 'c', 'd'].map(large), id)).status).toBe(201);
    const answers = await Promise.all([send([large('e')], id), send([large('f')], id)]);
    expect(answers.map(({ status }) => status).sort()).toEqual([201, 422]);
    const refused = answers.find(({ status }) => status === 422)!;
    expect((await refusal(refused)).message).toMatch(
      /would hold 27\.0 MB.*25 MB; 2\.5 MB are left/,
    );
  });

  test('a body without end is cut off while it comes', async () => {
    let sent = 0;
    const endless = new ReadableStream<Uint8Array>({
      pull(controller) {
        sent += 1_000_000;
        controller.enqueue(new Uint8Array(1_000_000));
      },
    });
    cast.ask('machinist');
    const request = new Request(`http://127.0.0.1:3000/api/orders/${order}/messages`, {
      method: 'POST',
      headers: { host: '127.0.0.1:3000', 'content-type': 'multipart/form-data; boundary=x' },
      body: endless,
      duplex: 'half',
    } as RequestInit);
    const response = await WRITE(request, { params: Promise.resolve({ id: order }) });
    expect(response.status).toBe(422);
    expect((await refusal(response)).message).toContain('larger than 20.1 MB');
    expect(sent).toBeLessThan(24_000_000);
  });

  test('a header that says too much is believed at once', async () => {
    cast.ask('machinist');
    const response = await call(
      WRITE,
      { id: order },
      {
        method: 'POST',
        form: formOf({ kind: 'remark', text: 'x' }),
        headers: { 'content-length': '30000000' },
      },
    );
    expect((await refusal(response)).message).toContain('larger than 20.1 MB');
  });

  test.each([
    ['JSON', { body: { kind: 'remark', text: 'x' } }, 'not a form'],
    [
      'a form cut short',
      {
        raw: '--x\r\nContent-Dispo',
        headers: { 'content-type': 'multipart/form-data; boundary=x' },
      },
      'cannot be read|can be read',
    ],
    [
      'a form without a boundary',
      { raw: 'x', headers: { 'content-type': 'multipart/form-data' } },
      'can be read',
    ],
  ])('%s instead of a form', async (_what, options, words) => {
    cast.ask('machinist');
    const response = await call(WRITE, { id: order }, { method: 'POST', ...options });
    expect(response.status).toBe(422);
    expect((await refusal(response)).message).toMatch(new RegExp(words));
  });

  test.each([
    [{ kind: 'remark', text: ' ' }, 'text'],
    [{ kind: 'question', text: '', version: 1 }, 'text'],
    [{ kind: 'remark', text: 'x'.repeat(2001) }, 'text'],
    [{ kind: 'remark', text: 'a\0b' }, 'text'],
    [{ kind: 'shout', text: 'x' }, 'kind'],
    [{ kind: 'question', text: 'x', version: 'last' }, 'version'],
    [{ kind: 'question', text: 'x' }, 'version'],
  ])('%j', async (fields: Record<string, string | number>, field) => {
    cast.ask('machinist');
    const before = await countAll();
    expect(await refusal(await write(order, fields))).toMatchObject({
      code: 'bad-input',
      field,
    });
    expect(await countAll()).toEqual(before);
  });

  test('a photo alone is a remark', async () => {
    cast.ask('machinist');
    const response = await write(order, { kind: 'remark', text: '' }, [
      fileOf('burr.png', png()),
    ]);
    expect(response.status).toBe(201);
  });
});

describe('who gets it', () => {
  test('members of the workshop and nobody else; what is no attachment is not found', async () => {
    cast.ask('machinist');
    const [attached] = await attachedTo(await send([fileOf('burr.png', png())]));
    const id = attached!.id;
    for (const [caller, status] of [
      ['owner', 200],
      ['builder', 200],
      ['machinist', 200],
      ['outsider', 404],
      ['removed', 401],
      ['signedOut', 401],
    ] as const) {
      cast.ask(caller);
      expect((await call(GET, { id })).status, caller).toBe(status);
    }
    cast.ask('owner');
    for (const none of [order, 'null', '', '../x']) {
      expect((await call(GET, { id: none })).status).toBe(404);
    }
  });

  test('nothing is read from somebody whose order it is not', async () => {
    const others = await Cast.gather();
    others.ask('owner');
    const before = await countAll();
    expect((await send([fileOf('burr.png', png())])).status).toBe(404);
    expect(await countAll()).toEqual(before);
    cast.ask('owner');
    expect((await get(order)).status).toBe(200);
  });

  test('who has it already gets it no second time', async () => {
    cast.ask('machinist');
    const [attached] = await attachedTo(await send([fileOf('burr.png', png())]));
    const first = await call(GET, { id: attached!.id });
    const etag = first.headers.get('etag')!;
    const again = await call(GET, { id: attached!.id }, { headers: { 'if-none-match': etag } });
    expect(again.status).toBe(304);
  });
});
