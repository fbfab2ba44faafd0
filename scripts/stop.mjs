/** What has been started and must end with us, last started first. */

const running = [];
let stopping;

/** A failure with words for the person at the terminal: shown without a stack. */
export class Stop extends Error {}

/** Has `end` called when this process stops. Returns a function that calls it now, once. */
export function endWithUs(end) {
  const entry = { end };
  running.push(entry);
  return async () => {
    const at = running.indexOf(entry);
    if (at < 0) return;
    running.splice(at, 1);
    await end();
  };
}

/** Ends everything, last started first; a second call waits for the first. */
export function stopAll() {
  stopping ??= (async () => {
    while (running.length > 0) {
      const { end } = running.pop();
      try {
        await end();
      } catch (error) {
        console.error(`While stopping: ${error.message}`);
      }
    }
  })();
  return stopping;
}

export const isStopping = () => stopping !== undefined;

/** Runs `main`; ends everything afterwards, at Ctrl-C, and at SIGTERM or SIGHUP. */
export async function runUntilStopped(main) {
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) {
    process.on(signal, () => {
      void stopAll().then(() => process.exit(process.exitCode ?? 0));
    });
  }
  try {
    await main();
  } catch (error) {
    // What fails because we are stopping is no failure.
    if (!isStopping()) {
      process.exitCode = 1;
      console.error(error instanceof Stop ? error.message : error);
    }
  }
  await stopAll();
  process.exit();
}
