/** The linter's walls do stand: each import below has to be refused, or let through. */

import { join } from 'node:path';
import { ESLint } from 'eslint';
import { expect, test } from 'vitest';

const root = join(import.meta.dirname, '..', '..');
const eslint = new ESLint({ cwd: root });
const wallRules = ['import/no-restricted-paths', 'no-restricted-imports', 'import/no-cycle'];

/** The rules that refuse this source as the text of this file. */
async function refusals(file: string, source: string): Promise<string[]> {
  const [result] = await eslint.lintText(source, { filePath: join(root, file) });
  expect(result!.messages.filter(({ fatal }) => fatal)).toEqual([]);
  return result!.messages.map(({ ruleId }) => ruleId ?? '').filter((rule) => rule !== '');
}

test.each([
  ['geometry/derive.ts', '@/lib/schemas/design'],
  ['geometry/derive.ts', '@/entities'],
  ['geometry/derive.ts', '../lib/env'],
  ['geometry/files/index.ts', 'node:fs'],
  ['geometry/derive.ts', 'fs'],
  ['geometry/derive.ts', 'zod'],
  ['geometry/derive.ts', 'three'],
  ['geometry/derive.ts', 'react'],
  ['entities/user.ts', '@/lib/env'],
  ['entities/user.ts', '@/components/providers'],
  ['lib/schemas/api.ts', '@/lib/env'],
  ['lib/schemas/api.ts', 'node:crypto'],
  ['lib/queries.ts', '@/components/providers'],
  ['lib/queries.ts', '@/app/layout'],
  ['lib/queries.ts', 'three'],
  ['components/providers.tsx', '@/lib/env'],
  ['components/providers.tsx', '@/lib/access'],
  ['components/providers.tsx', '@/entities'],
  ['components/providers.tsx', '@/app/layout'],
  ['components/providers.tsx', '@mikro-orm/postgresql'],
  ['components/providers.tsx', 'three'],
  ['components/providers.tsx', '@react-three/fiber'],
  ['app/layout.tsx', 'three'],
  ['app/layout.tsx', '@/tests/support/call'],
])('%s may not import %s', async (file, imported) => {
  const rules = await refusals(file, `import '${imported}';\n`);
  expect(rules.some((rule) => wallRules.includes(rule))).toBe(true);
});

test.each([
  ['geometry/derive.ts', './design'],
  ['geometry/derive.ts', '@/geometry/design'],
  ['geometry/overlap.ts', 'clipper2-ts'],
  ['geometry/files/index.ts', 'makerjs'],
  ['entities/user.ts', '@/geometry'],
  ['lib/queries.ts', '@/entities'],
  ['components/providers.tsx', '@/geometry'],
  ['components/providers.tsx', '@/lib/schemas/api'],
  ['components/stack/any.tsx', 'three'],
  ['app/layout.tsx', '@/lib/access'],
  ['tests/routes/any.test.ts', '@/lib/access'],
])('%s may import %s', async (file, imported) => {
  const rules = await refusals(file, `import '${imported}';\n`);
  expect(rules.filter((rule) => wallRules.includes(rule))).toEqual([]);
});

test('a circle of imports is refused', async () => {
  // The rule reads the disk, so this one stands there; the linter's own run passes it by.
  const all = new ESLint({ cwd: root, ignore: false });
  const results = await all.lintFiles(['tests/house/circle/*.ts']);
  const rules = results.map(({ messages }) => messages.map(({ ruleId }) => ruleId));
  expect(rules).toEqual([['import/no-cycle'], ['import/no-cycle']]);
});

test.each(['Math.random()', 'new Date()', 'Date.now()', 'process.pid', "fetch('/')"])(
  'the kernel may not use %s',
  async (expression) => {
    const rules = await refusals('geometry/derive.ts', `export const x = ${expression};\n`);
    expect(rules.some((rule) => rule.startsWith('no-restricted-'))).toBe(true);
  },
);
