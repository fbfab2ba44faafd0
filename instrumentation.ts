import type { Instrumentation } from 'next';

/** Runs once as the server boots: an environment that is not complete stops it here. */
export async function register(): Promise<void> {
  if (process.env.NEXT_RUNTIME !== 'nodejs') return;
  const { env } = await import('./lib/env');
  env();
  const { defaultDesign } = await import('./geometry');
  const { warmKernel } = await import('./lib/kernel/kernel');
  // Not waited for: reading is possible meanwhile.
  void warmKernel(defaultDesign());
  // Streams to open screens never end by themselves; they would hold up the end of the server.
  const { changes } = await import('./lib/live/changes');
  for (const signal of ['SIGTERM', 'SIGINT'] as const) {
    process.on(signal, () => changes().endAll());
  }
}

/** What a page or an action threw, in the log's own form. Routes answer for themselves. */
export const onRequestError: Instrumentation.onRequestError = async (
  error,
  request,
  context,
) => {
  if (process.env.NEXT_RUNTIME !== 'nodejs') return;
  const { log } = await import('./lib/log');
  const { loggedPath } = await import('./lib/logged-path');
  log.error(
    { err: error, path: loggedPath(request.path), kind: context.routeType },
    'render failed',
  );
};
