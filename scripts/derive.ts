/** npm run derive -- design.json --out DIR: the kernel and its files, without server or database. */

import { mkdir, readFile, writeFile } from 'node:fs/promises';
import { basename, join } from 'node:path';
import { parseArgs } from 'node:util';
import { checkDesign, derive, formatQuantity, KernelError, type Finding } from '../geometry';
import { cutFiles } from '../geometry/files';

const USAGE = 'usage: npm run derive -- design.json --out DIR';

class Refusal extends Error {}

interface Named {
  readonly name: string;
  readonly design: unknown;
}

/** A file holds a bare design, or one with its name as the downloads write it. */
function named(content: unknown, path: string): Named {
  if (typeof content === 'object' && content !== null && 'design' in content) {
    const name =
      'name' in content && typeof content.name === 'string'
        ? content.name
        : basename(path, '.json');
    return { name, design: content.design };
  }
  return { name: basename(path, '.json'), design: content };
}

async function read(path: string): Promise<Named> {
  const text = await readFile(path, 'utf8').catch((error: NodeJS.ErrnoException) => {
    throw new Refusal(`${path}: can't be read (${error.code ?? error.message})`);
  });
  try {
    return named(JSON.parse(text), path);
  } catch (error) {
    throw new Refusal(`${path}: not JSON (${(error as Error).message})`);
  }
}

function line(finding: Finding): string {
  const { severity, section, label, value, limit, quantity, change } = finding;
  const where = section === null ? '' : `section ${section + 1}: `;
  const figures = `${formatQuantity(value, quantity, 4)} (limit ${formatQuantity(limit, quantity, 4)})`;
  return `${severity.padEnd(4)}  ${where}${label} ${figures}${change ? ` — ${change}` : ''}`;
}

async function run(): Promise<number> {
  const { values, positionals } = parseArgs({
    options: { out: { type: 'string' } },
    allowPositionals: true,
  });
  const [path] = positionals;
  if (!path || positionals.length > 1 || !values.out) throw new Refusal(USAGE);
  const { name, design } = await read(path);
  const derivation = derive(checkDesign(design));
  if (!derivation.ok) {
    console.error(derivation.findings.map(line).join('\n'));
    console.error('No plates: nothing was written.');
    return 1;
  }
  await mkdir(values.out, { recursive: true });
  for (const file of cutFiles(name, derivation.derived)) {
    await writeFile(join(values.out, file.name), file.text);
    console.log(join(values.out, file.name));
  }
  console.log(derivation.derived.findings.map(line).join('\n'));
  return 0;
}

run().then(
  (code) => {
    process.exitCode = code;
  },
  (error: unknown) => {
    const expected =
      error instanceof Refusal ||
      error instanceof KernelError ||
      (error instanceof TypeError && 'code' in error);
    console.error(expected ? (error as Error).message : error);
    process.exitCode = 2;
  },
);
