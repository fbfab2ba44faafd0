/** A PostgreSQL cluster of our own, on loopback, started and ended by us. */

import { spawn, spawnSync } from 'node:child_process';
import { createHash, randomBytes } from 'node:crypto';
import {
  chmodSync,
  chownSync,
  closeSync,
  existsSync,
  mkdirSync,
  mkdtempSync,
  openSync,
  readdirSync,
  readFileSync,
  renameSync,
  rmSync,
  statSync,
  writeFileSync,
} from 'node:fs';
import { join } from 'node:path';
import { isAlive, waitFor } from './command.mjs';
import { data, makeData } from './paths.mjs';
import { freePort } from './port.mjs';
import { endWithUs, Stop } from './stop.mjs';

const LOOPBACK = '127.0.0.1';
const USER = 'app';

/** Where the newest installed PostgreSQL has its programs, or null. */
export function postgresBinaries() {
  const base = '/usr/lib/postgresql';
  const versions = existsSync(base) ? readdirSync(base).map(Number).filter(Boolean) : [];
  const found = versions
    .sort((a, b) => b - a)
    .map((version) => join(base, String(version), 'bin'))
    .find((folder) => existsSync(join(folder, 'postgres')));
  return found ?? null;
}

/** Whom the server runs as: it refuses root, so then Debian's own postgres user. */
function serverUser() {
  if (process.getuid?.() !== 0) return {};
  const idOf = (flag) =>
    Number(spawnSync('id', [flag, 'postgres'], { encoding: 'utf8' }).stdout.trim());
  const [uid, gid] = [idOf('-u'), idOf('-g')];
  if (!uid || !gid) throw new Stop('There is no user postgres to run the database as.');
  return { uid, gid };
}

/** Runs one of PostgreSQL's programs. @throws Error with what it said. */
function run(program, args, options = {}) {
  const result = spawnSync(join(postgresBinaries(), program), args, {
    encoding: 'utf8',
    cwd: '/',
    ...options,
  });
  if (result.status === 0) return result.stdout;
  throw new Error(`${program} failed: ${result.error?.message ?? result.stderr.trim()}`);
}

/** Where the lasting cluster stands: in the clone, unless the server's user can't get there. */
function lastingFolder(user) {
  makeData();
  const reachable =
    user.uid === undefined ||
    spawnSync('test', ['-x', data], { ...user, cwd: '/' }).status === 0;
  if (reachable) return join(data, 'postgres');
  const tag = createHash('sha256').update(data).digest('hex').slice(0, 12);
  const folder = join('/var/tmp', `vaneloft-${tag}`);
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  // Anybody may write to /var/tmp: only a folder of our own, or of the server's user, will do.
  const owner = statSync(folder).uid;
  if (owner !== process.getuid() && owner !== user.uid) {
    throw new Stop(`${folder} belongs to somebody else; take it away and start again.`);
  }
  chownSync(folder, user.uid, user.gid);
  return join(folder, 'postgres');
}

function initialise(folder, password, user, extra) {
  const fresh = `${folder}.new`;
  rmSync(fresh, { recursive: true, force: true });
  mkdirSync(fresh, { recursive: true, mode: 0o700 });
  const passwordFile = `${folder}.pw`;
  writeFileSync(passwordFile, password, { mode: 0o600 });
  if (user.uid !== undefined) {
    chownSync(fresh, user.uid, user.gid);
    chownSync(passwordFile, user.uid, user.gid);
  }
  try {
    const how = ['-U', USER, '--auth=scram-sha-256', `--pwfile=${passwordFile}`, '-E', 'UTF8'];
    run('initdb', ['-D', fresh, ...how, '--locale=C.UTF-8', ...extra], user);
  } finally {
    rmSync(passwordFile, { force: true });
  }
  // Only a whole cluster gets the name: a kill half way leaves nothing that looks like one.
  renameSync(fresh, folder);
}

function isReady(port) {
  const args = ['-q', '-h', LOOPBACK, '-p', String(port), '-t', '1'];
  return spawnSync(join(postgresBinaries(), 'pg_isready'), args).status === 0;
}

/** The server that already runs on this cluster, after a hard kill of ours; clears a stale lock. */
async function runningServer(folder, borrow) {
  const lock = join(folder, 'postmaster.pid');
  if (!existsSync(lock)) return null;
  const lines = readFileSync(lock, 'utf8').split('\n');
  const [pid, port] = [Number(lines[0]), Number(lines[3])];
  const command = `/proc/${pid}/cmdline`;
  const ours =
    pid > 0 &&
    isAlive(pid) &&
    existsSync(command) &&
    readFileSync(command, 'utf8').split('\0').includes(folder);
  if (ours && port > 0 && (await waitFor(() => isReady(port), 20_000))) {
    return { port, stop: borrow ? async () => {} : endWithUs(() => end(pid)) };
  }
  if (ours)
    throw new Stop(`PostgreSQL (process ${pid}) runs but does not answer; end it first.`);
  // The number may belong to another program by now, which PostgreSQL would take for a server.
  rmSync(lock, { force: true });
  return null;
}

async function launch(folder, logFile, user, options, wanted) {
  for (let attempt = 1; ; attempt++) {
    const port = wanted ?? (await freePort());
    const output = openSync(logFile, 'a', 0o600);
    const settings = [`listen_addresses=${LOOPBACK}`, 'unix_socket_directories=', ...options];
    const child = spawn(
      join(postgresBinaries(), 'postgres'),
      ['-D', folder, '-p', String(port), ...settings.flatMap((setting) => ['-c', setting])],
      { ...user, cwd: '/', detached: true, stdio: ['ignore', output, output] },
    );
    closeSync(output);
    const stop = endWithUs(() => end(child.pid));
    const over = () => child.exitCode !== null || child.signalCode !== null;
    const started = await waitFor(() => over() || isReady(port), 60_000);
    if (started && !over()) {
      child.unref();
      return { port, stop, pid: child.pid };
    }
    await stop();
    // After a hard kill the old server's processes may need a moment to go.
    if (attempt === 5) {
      const said = readFileSync(logFile, 'utf8').trim().split('\n').slice(-5).join('\n');
      throw new Stop(`PostgreSQL did not start:\n${said}`);
    }
    await waitFor(() => false, 1_000);
  }
}

async function end(pid) {
  const gone = () => !isAlive(pid);
  for (const [signal, patience] of [
    ['SIGINT', 20_000],
    ['SIGQUIT', 5_000],
  ]) {
    if (gone()) return;
    process.kill(pid, signal);
    if (await waitFor(gone, patience, 50)) return;
  }
}

function cluster({ port, stop }, password) {
  const urlOf = (database) =>
    `postgresql://${USER}:${password}@${LOOPBACK}:${port}/${database}`;
  const query = (sql, database = 'postgres') =>
    run('psql', ['-X', '-q', '-A', '-t', '-v', 'ON_ERROR_STOP=1', '-c', sql, urlOf(database)]);
  return {
    stop,
    query,
    /** Makes the database when it isn't there. Resolves to its address. */
    ensureDatabase(name) {
      const there = query(`select 1 from pg_database where datname = '${name}'`).trim() === '1';
      if (!there) query(`create database "${name}"`);
      return urlOf(name);
    },
  };
}

/**
 * The cluster that lasts from start to start. It ends with this process, unless it is `borrow`ed
 * from another start that runs it.
 */
export async function startPostgres({ borrow = false } = {}) {
  const user = serverUser();
  const folder = lastingFolder(user);
  const passwordFile = join(data, 'postgres-password');
  if (!existsSync(folder)) {
    const fresh = randomBytes(24).toString('hex');
    writeFileSync(passwordFile, fresh, { mode: 0o600 });
    initialise(folder, fresh, user, []);
  }
  if (!existsSync(passwordFile)) {
    throw new Stop(`${passwordFile} is missing, and the database in ${folder} needs it.`);
  }
  const password = readFileSync(passwordFile, 'utf8');
  const server =
    (await runningServer(folder, borrow)) ??
    (await launch(folder, join(data, 'postgres.log'), user, []));
  return cluster(server, password);
}

/**
 * A cluster for one run. It goes with this process; `durable` for one whose data outlives a crash
 * of the server within the run.
 */
export async function startThrowawayPostgres({ durable = false } = {}) {
  const user = serverUser();
  const parent = mkdtempSync('/var/tmp/vaneloft-test-');
  chmodSync(parent, 0o711);
  if (user.uid !== undefined) chownSync(parent, user.uid, user.gid);
  const clear = endWithUs(() => rmSync(parent, { recursive: true, force: true }));
  const folder = join(parent, 'postgres');
  const password = randomBytes(24).toString('hex');
  initialise(folder, password, user, ['--no-sync']);
  const careless = ['fsync=off', 'synchronous_commit=off', 'full_page_writes=off'];
  const start = (port) =>
    launch(folder, join(parent, 'log'), user, durable ? [] : careless, port);
  let server = await start();
  return {
    ...cluster(server, password),
    async stop() {
      await server.stop();
      await clear();
    },
    /** Kills the server as a crash would; resolves to what starts it again on the same port. */
    async crash() {
      process.kill(server.pid, 'SIGKILL');
      await server.stop();
      return async () => {
        rmSync(join(folder, 'postmaster.pid'), { force: true });
        server = await start(server.port);
      };
    },
  };
}
