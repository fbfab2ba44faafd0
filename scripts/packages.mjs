import { createHash } from 'node:crypto';
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import { delimiter, join } from 'node:path';
import { mustRun } from './command.mjs';
import { root } from './paths.mjs';
import { postgresBinaries } from './postgres.mjs';
import { Stop } from './stop.mjs';

const onPath = (name) =>
  (process.env.PATH ?? '').split(delimiter).some((folder) => existsSync(join(folder, name)));

/** System packages that Vaneloft or its tests use: how to see one, and its Debian name. */
const known = {
  postgresql: { present: () => postgresBinaries() !== null, apt: 'postgresql' },
  chromium: { present: () => existsSync('/usr/bin/chromium'), apt: 'chromium' },
  ezdxf: {
    present: () => existsSync('/usr/lib/python3/dist-packages/ezdxf'),
    apt: 'python3-ezdxf',
  },
  poppler: { present: () => existsSync('/usr/bin/pdftoppm'), apt: 'poppler-utils' },
};

/** @throws Stop when this Node is too old. */
export function checkNode() {
  const [major, minor] = process.versions.node.split('.').map(Number);
  if (major > 20 || (major === 20 && minor >= 19)) return;
  throw new Stop(`Node ${process.versions.node} is too old; install Node 20.19 or newer.`);
}

const missingOf = (names) => names.filter((name) => !known[name].present());

/** Installs what is missing with apt, when root. @throws Stop saying what to install. */
export async function ensureSystemPackages(names) {
  const missing = missingOf(names);
  if (missing.length === 0) return;
  const packages = missing.map((name) => known[name].apt);
  if (process.getuid?.() !== 0 || !onPath('apt-get')) {
    throw new Stop(
      `${missing.join(', ')} missing; install with:  sudo apt-get install -y ${packages.join(' ')}`,
    );
  }
  console.log(`Installing ${packages.join(', ')}`);
  const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
  const quiet = { env, stdio: ['ignore', 'ignore', 'inherit'] };
  await mustRun('apt-get update', 'apt-get', ['update', '-q'], quiet);
  const install = ['install', '-y', '-q', '--no-install-recommends', ...packages];
  await mustRun('apt-get install', 'apt-get', install, quiet);
  const still = missingOf(names);
  if (still.length > 0) throw new Stop(`Still missing after installing: ${still.join(', ')}`);
}

/** The same for what is only good to have: without it, says so and goes on. */
export async function wantSystemPackages(names) {
  try {
    await ensureSystemPackages(names);
  } catch (error) {
    if (!(error instanceof Stop)) throw error;
    console.log(`Going on without ${missingOf(names).join(', ')}. ${error.message}`);
  }
}

/** Runs npm ci unless node_modules already holds what the lock file says. */
export async function ensureNodeModules() {
  const lock = createHash('sha256').update(readFileSync(join(root, 'package-lock.json')));
  const hash = lock.digest('hex');
  const stamp = join(root, 'node_modules', '.lock-hash');
  if (existsSync(stamp) && readFileSync(stamp, 'utf8') === hash) return;
  console.log('Installing npm packages');
  // The build needs the development ones, whatever NODE_ENV says.
  await mustRun('npm ci', 'npm', ['ci', '--include=dev', '--no-audit', '--no-fund']);
  writeFileSync(stamp, hash);
}
