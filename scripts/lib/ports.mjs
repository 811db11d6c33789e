import { createServer } from 'node:net';
import { Refusal } from './main.mjs';

const listens = (port, host) =>
  new Promise((resolve) => {
    const server = createServer();
    server.once('error', (error) => resolve({ free: false, code: error.code }));
    server.listen(port, host, () => {
      const { port: taken } = server.address();
      server.close(() => resolve({ free: true, port: taken }));
    });
  });

/**
 * Whether nothing listens on this loopback port. A server on any other address counts too: a browser may resolve
 * "localhost" to ::1 and meet a stranger there.
 */
export async function isPortFree(port) {
  for (const host of ['127.0.0.1', '::1', '0.0.0.0']) {
    const { free, code } = await listens(port, host);
    if (!free && code !== 'EADDRNOTAVAIL' && code !== 'EAFNOSUPPORT') return false;
  }
  return true;
}

/** A loopback port the system says is free now. */
export async function freePort() {
  return (await listens(0, '127.0.0.1')).port;
}

/**
 * The first free port from `preferred` upwards that is not in `taken` (which it then joins).
 * @param {{preferred: number, taken: Set<number>}} wish
 */
export async function nextFreePort({ preferred, taken }) {
  for (let port = preferred; port < preferred + 200; port += 1) {
    if (taken.has(port) || !(await isPortFree(port))) continue;
    taken.add(port);
    return port;
  }
  throw new Refusal(`No free port from ${preferred} to ${preferred + 199}. Name one with --port.`);
}
