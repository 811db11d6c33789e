import { createServer, type RequestListener } from 'node:http';
import type { AddressInfo } from 'node:net';

/** A started stand-in. */
export interface Running {
  port: number;
  close: () => Promise<void>;
}

/** Where a stand-in listens: this machine only, unless its host says otherwise, as containers need. */
export interface Listening {
  /** 0 takes a free port. */
  port: number;
  host?: string | undefined;
}

/** Starts an HTTP server; rejects when the port is taken. */
export async function listen(handler: RequestListener, { port, host = '127.0.0.1' }: Listening): Promise<Running> {
  const server = createServer(handler);
  await new Promise<void>((resolve, reject) => {
    server.once('error', reject);
    server.listen(port, host, resolve);
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
