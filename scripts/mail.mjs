/** The mail side of a start: the worker that sends, and a stand-in where no mail server is given. */

import { join } from 'node:path';
import { startCommand } from './command.mjs';
import { freePort } from './port.mjs';
import { isStopping } from './stop.mjs';

/** Milliseconds until a worker that ended by itself is started again. */
const PAUSE = 2_000;

/** With a channel to us, by whose end they know that we are gone. */
const stdio = ['ignore', 'inherit', 'inherit', 'ipc'];

/** Starts a script, and again whenever it ends by itself. */
function keepRunning(what, args, env) {
  const start = () => {
    const { exited, end } = startCommand(process.execPath, args, { env, stdio, grace: 10_000 });
    exited.then(
      (code) => {
        if (isStopping()) return;
        void end();
        console.error(`${what} ended (${code}); starting it again.`);
        setTimeout(() => isStopping() || start(), PAUSE).unref();
      },
      (error) => console.error(`${what} did not start: ${error.message}`),
    );
  };
  start();
}

/**
 * Starts what sends mail. Resolves to the variables that the server needs for it: the folder to
 * read messages from, when they go to the stand-in.
 * @param env with OWNER_DATABASE_URL
 */
export async function startMail(env, folder) {
  let smtp = process.env.SMTP_URL;
  const given = Boolean(smtp);
  if (!given) {
    const port = await freePort();
    smtp = `smtp://127.0.0.1:${port}`;
    keepRunning(
      'The mail stand-in',
      [join('scripts', 'smtp-fake.mjs'), `${port}`, folder],
      env,
    );
  }
  keepRunning('The mail worker', ['--import', 'tsx', join('scripts', 'worker.ts')], {
    ...env,
    SMTP_URL: smtp,
  });
  return given ? {} : { MAIL_FOLDER: folder };
}
