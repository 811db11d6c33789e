import { createServer, type RequestListener } from 'node:http';
import type { AddressInfo } from 'node:net';

/** A started stand-in. */
export interface Running {
  port: number;
  close: () => Promise<void>;
}

/** Listens on all addresses, so that containers reach each other; port 0 takes a free one. Rejects when taken. */
export async function listen(handler: RequestListener, port: number): Promise<Running> {
  const server = createServer(handler);
  await new Promise<void>((resolve, reject) => {
    server.once('error', reject);
    server.listen(port, resolve);
  });
  return {
    port: (server.address() as AddressInfo).port,
    close: () =>
      new Promise((resolve, reject) => {
        server.close((error) => (error ? reject(error) : resolve()));
        server.closeAllConnections();
      }),
  };
}
