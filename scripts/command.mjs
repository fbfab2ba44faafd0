import { spawn } from 'node:child_process';
import { readFileSync } from 'node:fs';
import { root } from './paths.mjs';
import { endWithUs, Stop } from './stop.mjs';

const wait = (ms) => new Promise((resolve) => setTimeout(resolve, ms));

/** Is there such a process? */
export function isAlive(pid) {
  try {
    // One that has ended and waits for its parent to notice counts as gone.
    return !/\) Z/.test(readFileSync(`/proc/${pid}/stat`, 'utf8'));
  } catch {
    return false;
  }
}

/** Waits until `done` is true. Resolves to whether it was within `ms`. */
export async function waitFor(done, ms, every = 100) {
  const end = Date.now() + ms;
  while (!(await done())) {
    if (Date.now() > end) return false;
    await wait(every);
  }
  return true;
}

/**
 * Starts a command in a process group of its own: Ctrl-C in the terminal reaches us alone, and
 * we end the group in order.
 * @returns the child, `exited` (a promise of its code) and `end` (asks, waits, then insists).
 */
export function startCommand(command, args, options = {}) {
  const { grace = 15_000, ...rest } = options;
  const child = spawn(command, args, { cwd: root, stdio: 'inherit', detached: true, ...rest });
  const exited = new Promise((resolve, reject) => {
    child.once('error', reject);
    child.once('exit', (code, signal) => resolve(code ?? signal));
  });
  exited.catch(() => {});
  const signalGroup = (signal) => {
    try {
      process.kill(-child.pid, signal);
    } catch (error) {
      if (error.code !== 'ESRCH') throw error;
    }
  };
  const over = () => child.exitCode !== null || child.signalCode !== null;
  const end = endWithUs(async () => {
    if (child.pid === undefined) return;
    if (!over()) {
      signalGroup('SIGTERM');
      await waitFor(over, grace);
    }
    // Whatever the command left behind in its group.
    signalGroup('SIGKILL');
  });
  return { child, exited, end };
}

/** Runs a command to its end. Resolves to its exit code. */
export async function runCommand(command, args, options) {
  const { exited, end } = startCommand(command, args, options);
  const code = await exited;
  await end();
  return code;
}

/** The same, for what must succeed. @throws Stop */
export async function mustRun(what, command, args, options) {
  const code = await runCommand(command, args, options);
  if (code !== 0) throw new Stop(`${what} failed (${code}).`);
}
