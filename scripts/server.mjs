import { next, nextEnvironment } from './build.mjs';
import { startCommand, waitFor } from './command.mjs';
import { isStopping, Stop } from './stop.mjs';

/** Milliseconds that requests under way are given to finish. */
const GRACE = 30_000;
const START_LIMIT = 90_000;

/**
 * Starts Next's server and waits until it and its database answer. At the end it takes no new
 * requests and finishes those under way.
 */
export async function startServer({ mode = 'start', host, port, env, stdio = 'inherit' }) {
  const server = startCommand(process.execPath, [next, mode, '-H', host, '-p', String(port)], {
    env: { ...nextEnvironment, ...env, PORT: String(port) },
    stdio,
    grace: GRACE,
  });
  let over = false;
  void server.exited.then(() => (over = true));
  const address = host === '0.0.0.0' ? '127.0.0.1' : host === '::' ? '[::1]' : host;
  const answers = () =>
    fetch(`http://${address}:${port}/api/health`, { signal: AbortSignal.timeout(5_000) }).then(
      (response) => response.ok,
      () => false,
    );
  const ready = await waitFor(async () => over || (await answers()), START_LIMIT, 200);
  if (isStopping()) throw new Stop('Stopped.');
  if (over) throw new Stop('The server ended as it started; see above.');
  if (!ready) throw new Stop(`The server did not answer within ${START_LIMIT / 1000} seconds.`);
  return server;
}
