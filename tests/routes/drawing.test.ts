/** The drawing as it is served: its paper measured, its words read, by poppler where it is there. */
import { execFileSync, spawnSync } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { GET as DOWNLOAD } from '@/app/api/designs/[id]/files/[name]/route';
import { GET as LIST } from '@/app/api/designs/[id]/files/route';
import { designFilesSchema } from '@/lib/schemas/api';
import { call } from '../support/call';
import { Cast } from '../support/cast';

let bytes: Buffer;
let folder: string;

beforeAll(async () => {
  const cast = await Cast.gather();
  const id = await cast.design();
  cast.ask('builder');
  const { files } = designFilesSchema.parse(await (await call(LIST, { id })).json());
  const { name } = files.find(({ kind }) => kind === 'pdf')!;
  bytes = Buffer.from(await (await call(DOWNLOAD, { id, name })).arrayBuffer());
  folder = mkdtempSync(join(tmpdir(), 'vaneloft-pdf-'));
  writeFileSync(join(folder, 'drawing.pdf'), bytes);
});
afterAll(() => rmSync(folder, { recursive: true }));

test('it is a PDF with an embedded face', () => {
  expect(bytes.subarray(0, 5).toString()).toBe('%PDF-');
  expect(bytes.toString('latin1')).toContain('/FontFile2');
});

const hasPoppler = spawnSync('pdftoppm', ['-v']).status === 0;

describe.runIf(hasPoppler)('poppler', () => {
  test('reads the words, special signs too', () => {
    const words = execFileSync('pdftotext', ['-layout', join(folder, 'drawing.pdf'), '-'], {
      encoding: 'utf8',
    });
    for (const word of ['Assembly drawing', 'Rotor plate, section 1', 'Ø', '×', '°']) {
      expect(words).toContain(word);
    }
  });

  test('the frame of the second sheet, A4, measures 180 mm across (ISO 5457)', () => {
    // 254 dpi is 10 pixels for a millimetre.
    execFileSync(
      'pdftoppm',
      ['-r', '254', '-gray', '-f', '2', '-l', '2', 'drawing.pdf', 'page'],
      {
        cwd: folder,
      },
    );
    const [page] = execFileSync('ls', [folder], { encoding: 'utf8' }).match(/page\S*\.pgm/g)!;
    const pixels = execFileSync('cat', [join(folder, page!)], { maxBuffer: 1e8 });
    const [header, width, height] = /^P5\s+(\d+)\s+(\d+)\s+255\s/.exec(
      pixels.subarray(0, 40).toString('latin1'),
    )!;
    // Rounded up to whole pixels.
    expect([Number(width) / 10, Number(height) / 10].map(Math.floor)).toEqual([210, 297]);
    const stride = Number(width);
    // A row between zones, below the drawing's middle: the frame is its first and last dark run.
    const row = pixels.subarray(header.length + 2050 * stride, header.length + 2051 * stride);
    const dark = [...row].flatMap((value, x) =>
      value < 128 && x > 160 && x < 2050 ? [x] : [],
    );
    const middleOf = (xs: number[]): number => (xs[0]! + xs.at(-1)! + 1) / 2;
    const left = middleOf(dark.filter((x) => x < dark[0]! + 12));
    const right = middleOf(dark.filter((x) => x > dark.at(-1)! - 12));
    expect((right - left) / 10).toBeCloseTo(180, 0);
    expect(Math.abs((right - left) / 10 - 180)).toBeLessThan(0.2);
  });
});
