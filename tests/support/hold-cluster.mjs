/** Starts the lasting cluster, says where it is, and holds it until it is stopped. */

import { startPostgres } from '../../scripts/postgres.mjs';
import { runUntilStopped } from '../../scripts/stop.mjs';

await runUntilStopped(async () => {
  const cluster = await startPostgres();
  console.log(cluster.ensureDatabase('kept'));
  await new Promise((resolve) => setTimeout(resolve, 120_000));
});
