// Free ports on loopback.
import { createServer } from 'node:net';

export function isFree(port) {
  return new Promise((resolve) => {
    const probe = createServer();
    probe.once('error', () => resolve(false));
    probe.listen({ host: '127.0.0.1', port, exclusive: true }, () =>
      probe.close(() => resolve(true)),
    );
  });
}

/** The wanted port or the first free one of the next hundred. */
export async function freePortFrom(wanted) {
  for (let port = wanted; port < wanted + 100; port += 1) if (await isFree(port)) return port;
  throw new Error(`no free port from ${wanted} to ${wanted + 99}`);
}

/** Any free port, as the system picks it. */
export function anyFreePort() {
  return new Promise((resolve, reject) => {
    const probe = createServer();
    probe.once('error', reject);
    probe.listen({ host: '127.0.0.1', port: 0 }, () => {
      const { port } = probe.address();
      probe.close(() => resolve(port));
    });
  });
}
