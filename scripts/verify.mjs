/** npm run verify: format, lint, types and kernel tests. No database; under a minute. */

import { printTally, verify } from './checks.mjs';
import { checkNode, ensureNodeModules } from './packages.mjs';
import { makeData } from './paths.mjs';
import { runUntilStopped } from './stop.mjs';

await runUntilStopped(async () => {
  checkNode();
  makeData();
  await ensureNodeModules();
  const started = Date.now();
  await verify();
  printTally();
  console.log(`${((Date.now() - started) / 1000).toFixed(1)} s`);
});
