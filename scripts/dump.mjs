/** PostgreSQL's own dump and restore, all or nothing. */

import { spawn, spawnSync } from 'node:child_process';
import { closeSync, existsSync, openSync, renameSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { postgresBinaries } from './postgres.mjs';
import { Stop } from './stop.mjs';

function program(name) {
  const folder = postgresBinaries();
  if (!folder) throw new Stop('PostgreSQL is not installed here; its pg_dump is needed.');
  return join(folder, name);
}

/** How a program reaches the database: the password in its environment, where others can't list it. */
function access(url) {
  const address = new URL(url);
  const env = { ...process.env, PGPASSWORD: decodeURIComponent(address.password) };
  address.password = '';
  return { address: address.href, env };
}

/** Everything the database at `url` holds, into one file, which is whole or not there. */
export function dumpTo(url, file) {
  if (existsSync(file)) throw new Stop(`${file} is there already; name another file.`);
  const partial = `${file}.partial`;
  const { address, env } = access(url);
  const args = ['--format=custom', '--no-owner', '--no-acl', `--file=${partial}`, address];
  // Passwords' hashes are in it, and all that a workshop would not show.
  rmSync(partial, { force: true });
  closeSync(openSync(partial, 'wx', 0o600));
  const options = { encoding: 'utf8', env };
  const { status, stderr, error } = spawnSync(program('pg_dump'), args, options);
  if (status !== 0) {
    rmSync(partial, { force: true });
    throw new Stop(`The backup failed: ${error?.message ?? stderr.trim()}`);
  }
  renameSync(partial, file);
}

/**
 * Puts a dump in the place of all that the database at `url` holds, in one transaction: after a
 * failure it holds what it held.
 */
export async function restoreFrom(url, file) {
  if (!existsSync(file)) throw new Stop(`${file} is not there.`);
  const script = spawn(program('pg_restore'), ['--no-owner', '--no-acl', '--file=-', file], {
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  const { address, env } = access(url);
  const into = spawn(
    program('psql'),
    ['-X', '-q', '--single-transaction', '-v', 'ON_ERROR_STOP=1', '-o', '/dev/null', address],
    { stdio: ['pipe', 'ignore', 'pipe'], env },
  );
  const said = [];
  for (const { stderr } of [script, into]) stderr.on('data', (chunk) => said.push(chunk));
  const scriptEnd = new Promise((resolve) => script.once('close', resolve));
  const intoEnd = new Promise((resolve) => into.once('close', resolve));
  // psql ends early at the first error; what is still coming has nowhere to go then.
  into.stdin.on('error', () => script.kill());
  into.stdin.write(`
    set client_min_messages = warning;
    drop schema if exists public cascade;
    drop schema if exists graphile_worker cascade;
    create schema public;
    grant usage on schema public to public;
  `);
  script.stdout.on('data', (chunk) => {
    if (!into.stdin.write(chunk)) {
      script.stdout.pause();
      into.stdin.once('drain', () => script.stdout.resume());
    }
  });
  const read = await scriptEnd;
  // A dump that could not be read to its end must not count: an error for psql to stop at.
  into.stdin.end(read === 0 ? '' : '\nselect 1/0;\n');
  if ((await intoEnd) !== 0 || read !== 0) {
    throw new Stop(
      `The restore failed; nothing was changed. ${Buffer.concat(said).toString('utf8').trim()}`,
    );
  }
}
