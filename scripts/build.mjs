import { createHash } from 'node:crypto';
import {
  existsSync,
  readdirSync,
  readFileSync,
  rmSync,
  statSync,
  writeFileSync,
} from 'node:fs';
import { join } from 'node:path';
import { mustRun } from './command.mjs';
import { root } from './paths.mjs';

/** All that goes into a build. */
const sources = [
  'app',
  'components',
  'entities',
  'fonts',
  'geometry',
  'lib',
  'migrations',
  'public',
  'instrumentation.ts',
  'mikro-orm.config.ts',
  'next.config.mjs',
  'package-lock.json',
  'postcss.config.mjs',
  'proxy.ts',
  'tsconfig.json',
];

export const next = join(root, 'node_modules', 'next', 'dist', 'bin', 'next');
export const nextEnvironment = { ...process.env, NEXT_TELEMETRY_DISABLED: '1' };
const built = join(root, process.env.NEXT_DIST_DIR ?? '.next');
const stamp = join(built, 'source-hash');

function addTo(hash, path) {
  const whole = join(root, path);
  if (!existsSync(whole)) return;
  if (statSync(whole).isDirectory()) {
    for (const name of readdirSync(whole).sort()) addTo(hash, join(path, name));
  } else {
    hash.update(`${path}\0`).update(readFileSync(whole)).update('\0');
  }
}

/** A hash of everything that a build is made from. */
function sourceHash() {
  const hash = createHash('sha256');
  for (const path of sources) addTo(hash, path);
  return hash.digest('hex');
}

/** Builds for production, unless the build that stands is of these very sources. */
export async function ensureBuild() {
  const hash = sourceHash();
  const whole = existsSync(join(built, 'BUILD_ID')) && existsSync(stamp);
  if (whole && readFileSync(stamp, 'utf8') === hash) return;
  console.log('Building');
  rmSync(stamp, { force: true });
  const env = { ...nextEnvironment, NODE_ENV: 'production' };
  await mustRun('The build', process.execPath, [next, 'build'], { env });
  writeFileSync(stamp, hash);
}
