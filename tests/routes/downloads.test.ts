import { createHash } from 'node:crypto';
import { strFromU8, unzipSync } from 'fflate';
import { beforeAll, expect, test } from 'vitest';
import { GET as DOWNLOAD } from '@/app/api/designs/[id]/files/[name]/route';
import { GET as LIST } from '@/app/api/designs/[id]/files/route';
import { defaultDesign } from '@/geometry';
import { designFilesSchema } from '@/lib/schemas/api';
import { call, refusal } from '../support/call';
import { Cast } from '../support/cast';

let cast: Cast;

beforeAll(async () => {
  cast = await Cast.gather();
});

const filesOf = async (id: string) =>
  designFilesSchema.parse(await (await call(LIST, { id })).json()).files;
const sha256 = (bytes: ArrayBuffer) =>
  createHash('sha256').update(Buffer.from(bytes)).digest('hex');

test('a builder gets every file, byte for byte as listed, and the record has its hash', async () => {
  const id = await cast.design();
  cast.ask('builder');
  const files = await filesOf(id);
  expect(new Set(files.map(({ kind }) => kind))).toContain('dxf');
  for (const { name, sha256: listed, bytes } of files) {
    const response = await call(DOWNLOAD, { id, name });
    const body = await response.arrayBuffer();
    expect(response.status).toBe(200);
    expect(body.byteLength).toBe(bytes);
    expect(sha256(body)).toBe(listed);
    expect(response.headers.get('etag')).toBe(`"${listed}"`);
    expect(response.headers.get('content-disposition')).toMatch(/^attachment; filename="/);
    expect(response.headers.get('cache-control')).toBe('private, no-cache');
  }
  const rows = await cast.record(id);
  expect(rows.map(({ what }) => what)).toEqual(files.map(() => 'file-downloaded'));
  expect(rows.map(({ detail }) => [detail.file, detail.sha256])).toEqual(
    files.map(({ name, sha256: listed }) => [name, listed]),
  );
  expect(rows.every(({ who }) => who.id === cast.person('builder').id)).toBe(true);
});

test('every cut part is listed with its own files, as many and as large as they say', async () => {
  const id = await cast.design();
  cast.ask('builder');
  const { files, parts } = designFilesSchema.parse(await (await call(LIST, { id })).json());
  expect(parts.map(({ label }) => label)).toContain('Rotor plate, section 1');
  for (const { stem, quantity, thickness, picture } of parts) {
    expect(stem).toContain(`_${thickness.toFixed(2)}mm_${quantity}off`);
    expect(files.map(({ name }) => name)).toContain(`${stem}.dxf`);
    const svg = await (await call(DOWNLOAD, { id, name: `${stem}.svg` })).text();
    const [, width, height] = /width="([\d.]+)mm" height="([\d.]+)mm"/.exec(svg)!.map(Number);
    expect(picture.width).toBeCloseTo(width!, 3);
    expect(picture.height).toBeCloseTo(height!, 3);
  }
});

test('who has it already gets no second copy, and the record says so all the same', async () => {
  const id = await cast.design();
  cast.ask('builder');
  const [file] = await filesOf(id);
  const known = { 'if-none-match': `"other", W/"${file!.sha256}"` };
  const response = await call(DOWNLOAD, { id, name: file!.name }, { headers: known });
  expect(response.status).toBe(304);
  expect((await response.arrayBuffer()).byteLength).toBe(0);
  expect(await cast.record(id)).toHaveLength(1);
});

test('the ZIP holds every other file, and a manifest with its hash, part and quantity', async () => {
  const id = await cast.design();
  cast.ask('builder');
  const files = await filesOf(id);
  const zip = files.find(({ kind }) => kind === 'zip')!;
  const response = await call(DOWNLOAD, { id, name: zip.name });
  const entries = unzipSync(new Uint8Array(await response.arrayBuffer()));
  const held = Object.fromEntries(
    Object.entries(entries).map(([path, bytes]) => [path.split('/').at(-1)!, bytes]),
  );
  const manifest = JSON.parse(strFromU8(held['manifest.json']!)) as {
    files: { file: string; sha256: string; part?: string; quantity?: number }[];
  };
  const others = files.filter(({ kind }) => kind !== 'zip');
  expect(manifest.files.map(({ file }) => file)).toEqual(others.map(({ name }) => name));
  for (const { file, sha256: listed } of manifest.files) {
    const bytes = held[file]!;
    expect(createHash('sha256').update(bytes).digest('hex')).toBe(listed);
  }
  const rotor = manifest.files.find(({ part }) => part === 's1-rotor')!;
  expect(rotor.quantity).toBe(defaultDesign().sections[0]!.rotorPlates);
});

test('the same design gives the same bytes twice', async () => {
  const id = await cast.design();
  cast.ask('builder');
  expect(await filesOf(id)).toEqual(await filesOf(id));
});

test('a name that is no file of the design is not found, and not recorded', async () => {
  const id = await cast.design();
  cast.ask('builder');
  for (const name of ['nothing.dxf', '../../package.json', '', '%00']) {
    expect((await call(DOWNLOAD, { id, name })).status).toBe(404);
  }
  expect(await cast.record(id)).toHaveLength(0);
});

test('a design name of any letters gives a header that holds', async () => {
  const id = await cast.design(defaultDesign(), 'Ω "section"; \r\nX-Evil: 1 — Größe');
  cast.ask('builder');
  for (const { name } of await filesOf(id)) {
    const response = await call(DOWNLOAD, { id, name });
    expect(response.status).toBe(200);
    expect(response.headers.get('x-evil')).toBeNull();
    expect(response.headers.get('content-disposition')).toMatch(
      /^attachment; filename="[\w.() -]+"; filename\*=UTF-8''[\w%.~!$&+^`|-]+$/,
    );
  }
});

test('a design without plates has no files, and says why', async () => {
  const design = defaultDesign();
  Object.assign(design.sections[0]!, { targetKind: 'terminals', maxCapacitance: 40e-9 });
  design.largestRadius = 20;
  const id = await cast.design(design);
  cast.ask('builder');
  const answers = [await call(LIST, { id }), await call(DOWNLOAD, { id, name: 'all.dxf' })];
  for (const answer of answers) {
    expect(answer.status).toBe(422);
    expect((await refusal(answer)).code).toBe('checks-fail');
  }
});
