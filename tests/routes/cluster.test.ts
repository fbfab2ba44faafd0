/** The PostgreSQL that npm start brings along: it lasts, ends with its start, and survives kills. */

import { spawn, type ChildProcess } from 'node:child_process';
import { chmodSync, mkdtempSync, readdirSync, readFileSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { Client } from 'pg';
import { afterAll, afterEach, beforeAll, expect, test, vi } from 'vitest';

// A server is started and ended several times in each test.
vi.setConfig({ testTimeout: 90_000, hookTimeout: 90_000 });

const script = join(import.meta.dirname, '..', 'support', 'hold-cluster.mjs');
let data: string;
let holders: ChildProcess[] = [];

beforeAll(() => {
  data = mkdtempSync('/var/tmp/vaneloft-test-');
  // The server's own user has to get in.
  chmodSync(data, 0o711);
});

const gone = (child: ChildProcess) => child.exitCode !== null || child.signalCode !== null;

async function until(done: () => boolean): Promise<void> {
  for (let i = 0; i < 300 && !done(); i++)
    await new Promise((resolve) => setTimeout(resolve, 100));
  expect(done()).toBe(true);
}

/** A start that holds the cluster, and the cluster's address. */
async function hold(): Promise<{ child: ChildProcess; address: string }> {
  const child = spawn(process.execPath, [script], {
    env: { ...process.env, VANELOFT_DATA: data },
    stdio: ['ignore', 'pipe', 'inherit'],
  });
  holders.push(child);
  let said = '';
  child.stdout!.on('data', (chunk: Buffer) => (said += chunk.toString()));
  await until(() => said.includes('\n') || gone(child));
  return { child, address: said.trim() };
}

async function stop(child: ChildProcess): Promise<void> {
  child.kill('SIGTERM');
  await until(() => gone(child));
}

const serverPid = () =>
  Number(readFileSync(join(data, 'postgres', 'postmaster.pid'), 'utf8').split('\n')[0]);

/** Processes whose command names the cluster's folder. */
const serversLeft = () =>
  readdirSync('/proc')
    .filter((name) => /^\d+$/.test(name))
    .filter((pid) => {
      try {
        return readFileSync(`/proc/${pid}/cmdline`, 'utf8').includes(`${data}/postgres`);
      } catch {
        return false;
      }
    });

async function query(address: string, sql: string): Promise<unknown[]> {
  const client = new Client({ connectionString: address });
  await client.connect();
  try {
    return (await client.query(sql)).rows as unknown[];
  } finally {
    await client.end();
  }
}

afterEach(async () => {
  await Promise.all(holders.filter((child) => !gone(child)).map(stop));
  holders = [];
});

afterAll(async () => {
  // Whatever a failed test left: one more start takes it over, and its stop ends it.
  await stop((await hold()).child);
  rmSync(data, { recursive: true, force: true });
});

test('it keeps what is written, and its start leaves nothing running', async () => {
  const first = await hold();
  await query(first.address, 'create table kept as select 7 as n');
  await stop(first.child);
  expect(first.child.exitCode).toBe(0);
  expect(serversLeft()).toEqual([]);
  const second = await hold();
  expect(await query(second.address, 'select n from kept')).toEqual([{ n: 7 }]);
});

test('it asks for its password, and listens on loopback alone', async () => {
  const { address } = await hold();
  const wrong = new URL(address);
  wrong.password = 'guessed';
  await expect(query(wrong.href, 'select 1')).rejects.toThrow(/password authentication failed/);
  expect(await query(address, 'show listen_addresses')).toEqual([
    { listen_addresses: '127.0.0.1' },
  ]);
});

test('after a hard kill of the start, the next one takes the running server over', async () => {
  const first = await hold();
  const pid = serverPid();
  first.child.kill('SIGKILL');
  await until(() => gone(first.child));
  expect(serversLeft()).not.toEqual([]);
  const second = await hold();
  expect(second.address).toBe(first.address);
  expect(serverPid()).toBe(pid);
  await stop(second.child);
  expect(serversLeft()).toEqual([]);
});

test('after a hard kill of both, the next start clears the stale lock', async () => {
  const first = await hold();
  const pid = serverPid();
  first.child.kill('SIGKILL');
  process.kill(pid, 'SIGKILL');
  await until(() => gone(first.child));
  const second = await hold();
  expect(serverPid()).not.toBe(pid);
  expect(await query(second.address, 'select 1 as n')).toEqual([{ n: 1 }]);
});
