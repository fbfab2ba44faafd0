/**
 * npm run web: one more application process on a database that is there already, without worker,
 * migration or seed. Takes DATABASE_URL, NEXTAUTH_SECRET and NEXTAUTH_URL from the environment.
 */

import { appUrlOf } from './app-url.mjs';
import { ensureBuild } from './build.mjs';
import { checkNode, ensureNodeModules } from './packages.mjs';
import { makeData } from './paths.mjs';
import { freePortFrom } from './port.mjs';
import { startServer } from './server.mjs';
import { runUntilStopped, Stop } from './stop.mjs';

await runUntilStopped(async () => {
  checkNode();
  makeData();
  const { DATABASE_URL, NEXTAUTH_SECRET, NEXTAUTH_URL } = process.env;
  for (const [name, value] of Object.entries({ DATABASE_URL, NEXTAUTH_SECRET, NEXTAUTH_URL })) {
    if (!value) throw new Stop(`${name}: missing; give what the other processes have.`);
  }
  await ensureNodeModules();
  await ensureBuild();
  const port = Number(process.env.PORT || 3000);
  const host = process.env.HOST || '127.0.0.1';
  if ((await freePortFrom(port, host)) !== port) throw new Stop(`PORT: ${port} is taken.`);
  const server = await startServer({
    host,
    port,
    env: {
      DATABASE_URL: appUrlOf(DATABASE_URL, NEXTAUTH_SECRET),
      NEXTAUTH_URL,
      NEXTAUTH_SECRET,
    },
  });
  console.log(`An application process listens on port ${port}. Ctrl-C stops it.`);
  throw new Stop(`The server ended (${await server.exited}).`);
});
