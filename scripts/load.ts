/**
 * npm run load: a workshop of 100 members on one built application process, for a minute, on
 * loopback and in a database of its own. `--crash` kills PostgreSQL in the middle and starts it
 * again. Prints medians and 95th percentiles; fails on an error, a lost save, a lost or doubled
 * mail, and on reads slower than the bound.
 */

import { randomBytes } from 'node:crypto';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { setTimeout as wait } from 'node:timers/promises';
import { Client as Database } from 'pg';
import { appUrlOf } from './app-url.mjs';
import { ensureBuild } from './build.mjs';
import { Builder } from './load/builder';
import { Client, type Timing } from './load/client';
import { checkMails, inviteUntil } from './load/mails';
import { gather } from './load/people';
import { printTimings, slowReads } from './load/report';
import { startMail } from './mail.mjs';
import { freePort } from './port.mjs';
import { startThrowawayPostgres } from './postgres.mjs';
import { prepareDatabase } from './prepare-database';
import { startServer } from './server.mjs';
import { endWithUs, runUntilStopped } from './stop.mjs';

const MEMBERS = 100;
const SECONDS = 60;

/** Seconds that members arrive in before times count: connections are made, code is compiled. */
const ARRIVAL = 10;

/** How long the database is away, and how long after its return answers may still be refused, ms. */
const AWAY = 3_000;
const RECOVERY = 3_000;

/** The same choices in every run. */
function seeded(seed: number): () => number {
  let state = seed;
  return () => {
    state = (Math.imul(state, 1_664_525) + 1_013_904_223) >>> 0;
    return state / 2 ** 32;
  };
}

/** Versions of a design that were kept, oldest first. */
const historyIn = (ownerUrl: string) => async (id: string) => {
  const database = new Database({ connectionString: ownerUrl });
  await database.connect();
  const { rows } = await database.query<{ version: number }>(
    'select version from design_versions where design_id = $1 order by version',
    [id],
  );
  await database.end();
  return rows.map(({ version }) => version);
};

await runUntilStopped(async () => {
  const crash = process.argv.includes('--crash');
  const cluster = await startThrowawayPostgres({ durable: true });
  const owner = cluster.ensureDatabase('load');
  const secret = randomBytes(32).toString('base64url');
  const app = appUrlOf(owner, secret);
  await prepareDatabase(owner, app);
  await ensureBuild();

  const folder = mkdtempSync(join(tmpdir(), 'vaneloft-load-'));
  endWithUs(() => rmSync(folder, { recursive: true, force: true }));
  const port = await freePort();
  const address = `http://127.0.0.1:${port}`;
  const env = { DATABASE_URL: app, NEXTAUTH_URL: address, NEXTAUTH_SECRET: secret };
  const quiet = { ...process.env, ...env, LOG_LEVEL: 'error' };
  const mail = await startMail({ ...quiet, OWNER_DATABASE_URL: owner }, folder);
  await startServer({ host: '127.0.0.1', port, env: { ...env, ...mail, LOG_LEVEL: 'error' } });

  const people = await gather(owner, secret, MEMBERS - 1);
  const timings: Timing[] = [];
  const builders = people.builders.map(
    ({ cookie }, i) => new Builder(i + 1, new Client(address, cookie, timings), seeded(i + 1)),
  );
  console.log(`Making ${builders.length} designs`);
  for (const builder of builders) await builder.begin();
  timings.length = 0;

  console.log(
    `${MEMBERS} members for ${SECONDS} s${crash ? ', with a crash in the middle' : ''}`,
  );
  const started = performance.now();
  const over = () => performance.now() - started > (ARRIVAL + SECONDS) * 1_000;
  let away: [number, number] | null = null;
  const crashing = async (): Promise<void> => {
    await wait((ARRIVAL + SECONDS / 2) * 1_000);
    const from = performance.now();
    const restart = await cluster.crash();
    await wait(AWAY);
    await restart();
    away = [from, performance.now() + RECOVERY];
    console.log(`PostgreSQL was away for ${Math.round(performance.now() - from)} ms`);
  };
  await Promise.all([
    ...builders.map((builder) => builder.work(over)),
    inviteUntil(over, new Client(address, people.owner.cookie, timings)),
    ...(crash ? [crashing()] : []),
  ]);

  const history = historyIn(owner);
  const all = timings.slice();
  const measured = all.filter(({ at }) => at >= started + ARRIVAL * 1_000);
  for (const builder of builders) await builder.check(history);
  const { written, faults: mailFaults } = await checkMails(owner, folder);
  // While the database was away, an answer that says so is right; any other is not.
  const excused = ({ at, ms, status }: Timing) =>
    away !== null && at + ms >= away[0] && at <= away[1] && status === 503;
  const errors = all.filter(
    (timing) => (timing.status === 0 || timing.status >= 400) && !excused(timing),
  );
  printTimings(measured, SECONDS);
  console.log(`${written} mails written, each to be sent once`);
  const faults = [
    ...errors.map(({ kind, status }) => `${kind} answered ${status}`),
    ...builders.flatMap(({ faults }) => faults),
    ...mailFaults,
    ...(crash ? [] : slowReads(measured)),
  ];
  for (const fault of faults.slice(0, 20)) console.log(`  ${fault}`);
  console.log(`${faults.length} faults`);
  if (faults.length > 0) process.exitCode = 1;
});
