/**
 * Sends the mail that the database has queued, through the server at SMTP_URL, as the owner of the
 * tables. One worker at a time does so; another that is started waits to take its place.
 */

import { Logger, run, type Runner } from 'graphile-worker';
import { createTransport } from 'nodemailer';
import { Client, Pool } from 'pg';
import { z } from 'zod';
import { log } from '../lib/log';
import { mailSender } from '../lib/mail/mail-sender';

const settings = z
  .object({
    OWNER_DATABASE_URL: z.url({ protocol: /^postgres(ql)?$/ }),
    SMTP_URL: z.url({ protocol: /^smtps?$/ }),
    MAIL_FROM: z
      .string()
      .regex(/@[^\s<>@]+>?$/)
      .default('Vaneloft <post@vaneloft.example>'),
  })
  .parse({
    ...process.env,
    OWNER_DATABASE_URL: process.env.OWNER_DATABASE_URL || process.env.DATABASE_URL,
  });

/** A number of our own, held by the worker that works. */
const WORKER_LOCK = 80_411_909;

/** Longest pause before another try with the database, ms. */
const LONGEST_PAUSE = 10_000;

/** Longest wait for the sending under way, ms. */
const STOP_LIMIT = 8_000;

const wait = (ms: number) => new Promise<void>((resolve) => setTimeout(resolve, ms));

const transport = createTransport(
  {
    url: settings.SMTP_URL,
    connectionTimeout: 10_000,
    greetingTimeout: 10_000,
    socketTimeout: 30_000,
  },
  { from: settings.MAIL_FROM },
);
const connectionString = settings.OWNER_DATABASE_URL;
const pool = new Pool({ connectionString, max: 8, connectionTimeoutMillis: 5_000 });
const connectionLost = (error: Error) => log.warn({ err: error }, 'database connection lost');
pool.on('error', connectionLost);
// One that is in use when it breaks must not end the process.
pool.on('connect', (client) => client.on('error', connectionLost));

const send = mailSender(
  pool,
  (message) => transport.sendMail(message),
  /@([^\s<>@]+)>?$/.exec(settings.MAIL_FROM)![1]!,
  log,
);

/** The queue's own words, in our log, without stacks. */
const logger = new Logger(() => (level, message) => {
  const words = message.split('\n')[0]!;
  log[level === 'warning' ? 'warn' : level === 'error' ? 'error' : 'debug'](words);
});

let stopping = false;
/** Times in a row that the database was not there. */
let failures = 0;
let stop: () => void = () => {};

/** Works until it is told to stop, or the database is lost. */
async function work(): Promise<void> {
  const guard = new Client({ connectionString, connectionTimeoutMillis: 5_000 });
  const lost = new Promise<void>((resolve, reject) => {
    guard.on('error', reject);
    guard.on('end', () => reject(new Error('the database ended the connection')));
    stop = resolve;
  });
  lost.catch(() => {});
  let runner: Runner | undefined;
  try {
    await guard.connect();
    await Promise.race([guard.query('select pg_advisory_lock($1)', [WORKER_LOCK]), lost]);
    if (stopping) return;
    // Whoever held these is gone: only one works at a time.
    await guard.query(`select graphile_worker.force_unlock_workers(array(
      select locked_by from graphile_worker.jobs where locked_by is not null))`);
    runner = await run({
      pgPool: pool,
      concurrency: 4,
      pollInterval: 2_000,
      noHandleSignals: true,
      logger,
      preset: { worker: { completeJobBatchDelay: 0, failJobBatchDelay: 0 } },
      taskList: {
        'send-mail': (payload) => send(z.object({ id: z.uuid() }).parse(payload).id),
      },
    });
    failures = 0;
    log.info('the mail worker works');
    await Promise.race([runner.promise, lost]);
  } finally {
    runner?.promise.catch(() => {});
    // Without its database it may never be done; what it has under way is remembered by `send`.
    await Promise.race([runner?.stop().catch(() => {}), wait(STOP_LIMIT)]);
    guard.removeAllListeners('end');
    await guard.end().catch(() => {});
  }
}

function end(): void {
  stopping = true;
  stop();
}
for (const signal of ['SIGTERM', 'SIGINT'] as const) process.on(signal, end);
// Whoever started it is gone, however that came.
process.on('disconnect', end);

while (!stopping) {
  try {
    await work();
  } catch (error) {
    if (stopping) break;
    log.warn({ err: error }, 'the mail worker lost its database');
    failures += 1;
    await wait(Math.min(LONGEST_PAUSE, 250 * 2 ** failures));
  }
}
await pool.end();
transport.close();
process.exit();
