import { afterAll, expect, test, vi } from 'vitest';
import { defaultDesign } from '@/geometry';
import { deriveDesign as here } from '@/lib/kernel/derive-design';
import { makeFiles as filesHere } from '@/lib/kernel/make-files';

const names = {
  name: 'Bench section',
  number: 'A1',
  owner: 'Harrow Lane',
  revision: '1',
  issued: '2026-03-01T12:00:00.000Z',
  creator: 'Test builder',
  approved: '',
  status: 'Draft, not released',
  waivers: [],
};

afterAll(() => {
  process.env.KERNEL_THREADS = '0';
});

test('a thread of the kernel gives what the kernel gives, byte for byte', async () => {
  process.env.KERNEL_THREADS = '1';
  vi.resetModules();
  const { deriveDesign, makeFiles } = await import('@/lib/kernel/kernel');
  const design = defaultDesign();
  const derivation = await deriveDesign(design);
  const known = here(design);
  expect(derivation).toEqual(known);
  if (!known.ok) throw new Error('the default design has no plates');
  const files = await makeFiles(design, known.derived, names);
  const expected = await filesHere(known.derived, names);
  expect(files.map(({ name, sha256 }) => [name, sha256])).toEqual(
    expected.map(({ name, sha256 }) => [name, sha256]),
  );
  for (const [i, { body }] of files.entries()) {
    expect(Buffer.compare(Buffer.from(body), Buffer.from(expected[i]!.body))).toBe(0);
  }
}, 60_000);
