import { createServer } from 'node:net';

/**
 * Whether a port of the loopback address can be listened on.
 * @param {number} port 0 asks for any
 * @returns {Promise<number | null>} the port, or null when it is taken
 */
function tryPort(port) {
  return new Promise((resolve) => {
    const server = createServer();
    server.once('error', () => resolve(null));
    server.listen(port, '127.0.0.1', () => {
      const address = server.address();
      const free = typeof address === 'object' && address ? address.port : null;
      server.close(() => resolve(free));
    });
  });
}

/**
 * The first free port from `wanted` on, looking at twenty; else any free one.
 * @param {number} wanted
 */
export async function findPort(wanted) {
  for (let port = wanted; port < wanted + 20; port += 1) {
    const free = await tryPort(port);
    if (free !== null) return free;
  }
  return (await tryPort(0)) ?? wanted;
}

/** Any free port. */
export async function anyPort() {
  return (await tryPort(0)) ?? 0;
}
