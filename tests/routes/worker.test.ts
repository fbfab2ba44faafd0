/** The mail worker as a process: through a lost database, a refusing server and its own death. */

import { spawn, type ChildProcess } from 'node:child_process';
import { randomUUID } from 'node:crypto';
import { join } from 'node:path';
import { afterAll, beforeAll, expect, test, vi } from 'vitest';
import { Mail } from '@/entities';
import { within } from '@/lib/db';
import { entityManager } from '../support/as-owner';
import { openInbox, type Inbox } from '../support/smtp-inbox';

// Processes are started and lose their database in each test.
vi.setConfig({ testTimeout: 60_000 });

const root = join(import.meta.dirname, '..', '..');
const workers: ChildProcess[] = [];
let inbox: Inbox;

beforeAll(async () => {
  inbox = await openInbox();
});

afterAll(async () => {
  await Promise.all(workers.map((worker) => end(worker, 'SIGTERM')));
  await inbox.close();
});

function startWorker(): ChildProcess {
  const worker = spawn(process.execPath, ['--import', 'tsx', 'scripts/worker.ts'], {
    cwd: root,
    env: { ...process.env, SMTP_URL: inbox.url, LOG_LEVEL: 'silent' },
    // The queue's package traces each lost connection there.
    stdio: ['ignore', 'inherit', 'ignore', 'ipc'],
  });
  workers.push(worker);
  return worker;
}

const gone = (worker: ChildProcess) => worker.exitCode !== null || worker.signalCode !== null;

async function end(worker: ChildProcess, signal: NodeJS.Signals): Promise<void> {
  if (gone(worker)) return;
  const exited = new Promise((resolve) => worker.once('exit', resolve));
  worker.kill(signal);
  await exited;
}

/** Mails of no workshop, in one transaction of the application's. Resolves to their ids. */
async function write(count: number): Promise<string[]> {
  const email = `${randomUUID()}@test.example`;
  const ids = Array.from({ length: count }, () => randomUUID());
  await within({ email }, (tx) => {
    for (const id of ids) {
      tx.create(Mail, {
        id,
        workshop: null,
        kind: 'reset',
        event: `test:${id}`,
        toAddress: email,
        subject: 'Once',
        text: 'Once',
        html: '<p>Once</p>',
      });
    }
  });
  return ids;
}

const received = (ids: string[]) =>
  inbox.messages
    .map(({ messageId }) => messageId!.slice(1).split('@')[0]!)
    .filter((id) => ids.includes(id));

async function untilNoted(ids: string[]): Promise<void> {
  const em = await entityManager();
  await expect
    .poll(() => em.count(Mail, { id: ids, sentAt: { $ne: null } }), { timeout: 40_000 })
    .toBe(ids.length);
}

test('it sends what is queued, each once, while its database is lost again and again', async () => {
  startWorker();
  inbox.delay = 40;
  const ids = await write(40);
  const em = await entityManager();
  for (const share of [5, 15]) {
    await expect
      .poll(() => received(ids).length, { timeout: 30_000 })
      .toBeGreaterThanOrEqual(share);
    await em.execute(`select pg_terminate_backend(pid) from pg_stat_activity
      where datname = current_database() and usename = current_user
        and pid <> pg_backend_pid()`);
  }
  await untilNoted(ids);
  expect(received(ids).sort()).toEqual([...ids].sort());
});

test('it tries again by itself when the mail server refuses', async () => {
  inbox.refuse = 3;
  const ids = await write(3);
  await untilNoted(ids);
  expect(received(ids).sort()).toEqual([...ids].sort());
});

test('a second one waits, and takes over at once when the first is killed', async () => {
  const [first] = workers;
  const second = startWorker();
  const before = await write(5);
  await untilNoted(before);
  // Past what the server has said yes to nothing can be known; nothing is under way here.
  await end(first!, 'SIGKILL');
  const after = await write(5);
  await untilNoted(after);
  expect(received([...before, ...after]).sort()).toEqual([...before, ...after].sort());
  await end(second, 'SIGTERM');
  expect(second.exitCode).toBe(0);
});

test('it ends with whoever started it', async () => {
  const worker = startWorker();
  const ids = await write(1);
  await untilNoted(ids);
  worker.disconnect();
  await expect.poll(() => gone(worker), { timeout: 15_000 }).toBe(true);
});
