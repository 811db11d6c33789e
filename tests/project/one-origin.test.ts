import { createServer, request, type Server } from 'node:http';
import { connect, type AddressInfo } from 'node:net';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { serveOneOrigin } from '../../scripts/dev/one-origin.mjs';

const names = ['api', 'buyer', 'seller'] as const;
const servers: Server[] = [];
let port: number;

const portOf = (server: Server) => (server.address() as AddressInfo).port;

/** Answers with its name and what it was asked; accepts any upgrade and echoes. */
function startNamed(name: string): Promise<number> {
  const server = createServer((req, res) => res.setHeader('x-host', req.headers.host ?? '').end(`${name} ${req.url}`));
  server.on('upgrade', (_req, socket) => {
    socket.write(`HTTP/1.1 101 Switching Protocols\r\nUpgrade: echo\r\nConnection: Upgrade\r\nX-Name: ${name}\r\n\r\n`);
    socket.pipe(socket);
  });
  servers.push(server);
  return new Promise((resolve) => server.listen(0, '127.0.0.1', () => resolve(portOf(server))));
}

beforeAll(async () => {
  const [api = 0, buyer = 0, seller = 0] = await Promise.all(names.map(startNamed));
  const gone = createServer();
  const unreachable = await new Promise<number>((resolve) => gone.listen(0, '127.0.0.1', () => resolve(portOf(gone))));
  gone.close();
  const routes = [
    { prefix: '/api', port: api },
    { prefix: '/sell', port: seller },
    { prefix: '/desk', port: unreachable },
    { prefix: '/', port: buyer },
  ];
  const proxy = await serveOneOrigin({ port: 0, routes });
  servers.push(proxy);
  port = portOf(proxy);
});
afterAll(() => servers.forEach((server) => server.close().closeAllConnections()));

const get = (path: string) => fetch(`http://localhost:${port}${path}`);

describe('one origin', () => {
  it.each([
    ['/', 'buyer /'],
    ['/lots/1?sort=grade', 'buyer /lots/1?sort=grade'],
    ['/api/lots', 'api /api/lots'],
    ['/sell', 'seller /sell'],
    ['/sell/?x=1', 'seller /sell/?x=1'],
    ['/sellers', 'buyer /sellers'],
    ['/apiary', 'buyer /apiary'],
  ])('leads %s to its server', async (path, answer) => {
    expect(await (await get(path)).text()).toBe(answer);
  });

  it('passes the host on, on which links and the same-origin check hang', async () => {
    expect((await get('/api/x')).headers.get('x-host')).toBe(`localhost:${port}`);
  });

  it('says so when a server is away', async () => {
    const answer = await get('/desk/');
    expect(answer.status).toBe(502);
    expect(await answer.text()).toContain('restarting');
  });

  it('carries web sockets both ways', async () => {
    const headers = { connection: 'Upgrade', upgrade: 'echo' };
    const upgraded = new Promise<string>((resolve, reject) => {
      const asked = request({ host: 'localhost', port, path: '/sell/?token=1', headers });
      asked.once('upgrade', (res, socket) => {
        socket.once(
          'data',
          (data) => (socket.destroy(), resolve(`${res.headers['x-name'] as string} ${String(data)}`)),
        );
        socket.write('hello');
      });
      asked.once('error', reject).end();
    });
    expect(await upgraded).toBe('seller hello');
  });

  it('drops a web socket whose server is away', async () => {
    const closed = new Promise<string>((resolve) => {
      const socket = connect(port, 'localhost', () => {
        socket.write('GET /desk/ HTTP/1.1\r\nHost: x\r\nConnection: Upgrade\r\nUpgrade: echo\r\n\r\n');
      });
      socket.once('close', () => resolve('closed')).resume();
    });
    expect(await closed).toBe('closed');
  });
});
