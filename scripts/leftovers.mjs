/** One start at a time on one clone, and no server left over from a start that was killed. */

import { existsSync, readFileSync, readlinkSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { isAlive, waitFor } from './command.mjs';
import { data, makeData, root } from './paths.mjs';
import { endWithUs, Stop } from './stop.mjs';

const startFile = join(data, 'start.pid');
const serverFile = join(data, 'server.pid');

/** The process a file names, if it still runs, in this clone, with this word in its command. */
function livingProcess(file, word) {
  const pid = existsSync(file) ? Number(readFileSync(file, 'utf8')) : 0;
  if (!(pid > 1) || pid === process.pid || !isAlive(pid)) return null;
  try {
    const command = readFileSync(`/proc/${pid}/cmdline`, 'utf8').replaceAll('\0', ' ');
    const title = readFileSync(`/proc/${pid}/comm`, 'utf8');
    const here = readlinkSync(`/proc/${pid}/cwd`) === root;
    return here && `${command} ${title}`.includes(word) ? pid : null;
  } catch {
    // Not ours to look at, so not ours.
    return null;
  }
}

/** @throws Stop when another start runs on this clone. */
export async function claimClone() {
  makeData();
  const other = livingProcess(startFile, 'start.mjs');
  if (other) throw new Stop(`Vaneloft already runs from this folder (process ${other}).`);
  writeFileSync(startFile, String(process.pid));
  endWithUs(() => rmSync(startFile, { force: true }));

  const server = livingProcess(serverFile, 'next');
  if (!server) return;
  console.log('Ending the server that a killed start left behind');
  process.kill(server, 'SIGTERM');
  if (!(await waitFor(() => !isAlive(server), 10_000))) process.kill(server, 'SIGKILL');
}

/** Remembers the server, in case this start is killed. */
export function rememberServer(pid) {
  writeFileSync(serverFile, String(pid));
  endWithUs(() => rmSync(serverFile, { force: true }));
}
