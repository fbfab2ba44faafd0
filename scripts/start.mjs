/** npm start: from a fresh clone to a served workshop. npm run dev: the same with `--dev`. */

import { createHash } from 'node:crypto';
import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { ensureBuild } from './build.mjs';
import { mustRun } from './command.mjs';
import { databases, isGiven } from './databases.mjs';
import { claimClone, rememberServer } from './leftovers.mjs';
import { startMail } from './mail.mjs';
import { checkNode, ensureNodeModules, ensureSystemPackages } from './packages.mjs';
import { data, makeData } from './paths.mjs';
import { freePortFrom } from './port.mjs';
import { secret } from './secret.mjs';
import { startServer } from './server.mjs';
import { runUntilStopped, Stop } from './stop.mjs';

const dev = process.argv.includes('--dev');

/** The demo's passwords, one file for each database: another's would open nothing here. */
function signInsFile() {
  const { DATABASE_URL: given } = process.env;
  const tag = given ? `-${createHash('sha256').update(given).digest('hex').slice(0, 12)}` : '';
  return join(data, `sign-ins${tag}.json`);
}

function printSignIns(signIns) {
  if (!existsSync(signIns)) {
    console.log('The demo sign-ins were made by another start, which printed them.');
    return;
  }
  const people = JSON.parse(readFileSync(signIns, 'utf8'));
  const width = Math.max(...people.map(({ email }) => email.length));
  console.log('Demo sign-ins:');
  for (const { email, password, role, workshop } of people) {
    console.log(`  ${email.padEnd(width)}  ${password}  ${role}, ${workshop}`);
  }
}

async function main() {
  checkNode();
  makeData();
  if (!isGiven()) {
    await claimClone();
    await ensureSystemPackages(['postgresql']);
  }
  await ensureNodeModules();

  const signIns = signInsFile();
  if (!isGiven()) console.log('Starting PostgreSQL');
  const env = { ...process.env, ...(await databases()) };
  await mustRun('The migration', process.execPath, ['--import', 'tsx', 'scripts/migrate.ts'], {
    env,
  });
  await mustRun('The seed', process.execPath, ['--import', 'tsx', 'scripts/seed.ts', signIns], {
    env,
  });
  if (!dev) await ensureBuild();

  const host = process.env.HOST || '127.0.0.1';
  const wanted = Number(process.env.PORT || 3000);
  if (!Number.isInteger(wanted) || wanted < 1 || wanted > 65_535) {
    throw new Stop(`PORT: ${process.env.PORT} is not a port; give 1 to 65535.`);
  }
  const port = await freePortFrom(wanted, host);
  if (port !== wanted) console.log(`Port ${wanted} is taken; using ${port}.`);
  const shown = ['0.0.0.0', '::'].includes(host) ? 'localhost' : host;
  const address = process.env.NEXTAUTH_URL || `http://${shown}:${port}`;
  const mail = await startMail(env, join(data, 'mail'));
  const server = await startServer({
    mode: dev ? 'dev' : 'start',
    host,
    port,
    env: {
      DATABASE_URL: env.DATABASE_URL,
      NEXTAUTH_URL: address,
      NEXTAUTH_SECRET: secret(),
      ...mail,
    },
  });
  if (!isGiven()) rememberServer(server.child.pid);

  console.log(`\nVaneloft is at ${address}\n`);
  printSignIns(signIns);
  if (mail.MAIL_FOLDER) {
    console.log(`\nMail goes nowhere: owners read it at ${address}/people/mail`);
  }
  console.log('\nCtrl-C stops it.');
  throw new Stop(`The server ended (${await server.exited}).`);
}

await runUntilStopped(main);
