import { createServer } from 'node:net';

function isFree(port, host) {
  return new Promise((resolve) => {
    const probe = createServer();
    probe.once('error', () => resolve(false));
    probe.listen({ port, host, exclusive: true }, () => probe.close(() => resolve(true)));
  });
}

/** The first free port from `first` on. */
export async function freePortFrom(first, host = '127.0.0.1') {
  for (let port = first; port < Math.min(first + 200, 65_536); port++) {
    if (await isFree(port, host)) return port;
  }
  throw new Error(`no free port from ${first} on`);
}

/** Any free port. */
export function freePort(host = '127.0.0.1') {
  return new Promise((resolve, reject) => {
    const probe = createServer();
    probe.once('error', reject);
    probe.listen({ port: 0, host }, () => {
      const { port } = probe.address();
      probe.close(() => resolve(port));
    });
  });
}
