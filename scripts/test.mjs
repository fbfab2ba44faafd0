/** npm test: everything, on a fresh machine too. Its last line is `N passed, N failed`. */

import { randomBytes } from 'node:crypto';
import { join } from 'node:path';
import { appUrlOf } from './app-url.mjs';
import { ensureBuild } from './build.mjs';
import { check, playwright, printTally, unused, verify, vitest } from './checks.mjs';
import { mustRun } from './command.mjs';
import { startMail } from './mail.mjs';
import {
  checkNode,
  ensureNodeModules,
  ensureSystemPackages,
  wantSystemPackages,
} from './packages.mjs';
import { data, makeData } from './paths.mjs';
import { freePort } from './port.mjs';
import { startThrowawayPostgres } from './postgres.mjs';
import { startServer } from './server.mjs';
import { runUntilStopped } from './stop.mjs';

/** A served build with the demo workshop in a database of its own. Resolves to its environment. */
async function serve(cluster) {
  const port = await freePort();
  const signIns = join(data, 'test-sign-ins.json');
  const secret = randomBytes(32).toString('base64url');
  const owner = cluster.ensureDatabase('vaneloft');
  const env = {
    DATABASE_URL: appUrlOf(owner, secret),
    NEXTAUTH_URL: `http://127.0.0.1:${port}`,
    NEXTAUTH_SECRET: secret,
    LOG_LEVEL: 'warn',
  };
  const whole = { env: { ...process.env, ...env, OWNER_DATABASE_URL: owner } };
  await mustRun('migrate', process.execPath, ['--import', 'tsx', 'scripts/migrate.ts'], whole);
  await mustRun(
    'seed',
    process.execPath,
    ['--import', 'tsx', 'scripts/seed.ts', signIns],
    whole,
  );
  const mail = await startMail(whole.env, join(data, 'test-mail'));
  await startServer({ host: '127.0.0.1', port, env: { ...env, ...mail } });
  return { BASE_URL: env.NEXTAUTH_URL, SIGN_INS: signIns };
}

await runUntilStopped(async () => {
  checkNode();
  makeData();
  const started = Date.now();
  await ensureSystemPackages(['postgresql', 'chromium']);
  await wantSystemPackages(['ezdxf', 'poppler']);
  await ensureNodeModules();

  await verify();
  await unused();
  await vitest('thorough kernel and house', ['thorough', 'house']);

  const cluster = await startThrowawayPostgres();
  await vitest('route', ['routes'], { TEST_DATABASE_URL: cluster.ensureDatabase('template') });

  const built = await check('build', async () => (await ensureBuild(), true));
  let served = null;
  if (built) await check('serve', async () => ((served = await serve(cluster)), true));
  if (served) await playwright(served);

  console.log(`${Math.round((Date.now() - started) / 1000)} s`);
  printTally();
});
