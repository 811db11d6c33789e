import { createServer, request } from 'node:http';

/**
 * Puts several local servers behind one address, web sockets (hot reload) included.
 * @param {{port: number, routes: {prefix: string, port: number}[]}} plan the first route whose prefix fits serves a path
 * @returns the listening server
 */
export function serveOneOrigin({ port, routes }) {
  const portFor = (url) => routes.find(({ prefix }) => fits(url, prefix)).port;
  const server = createServer((incoming, outgoing) => {
    const onward = forward({ incoming, port: portFor(incoming.url) });
    onward.on('response', (answer) => {
      outgoing.writeHead(answer.statusCode, answer.rawHeaders);
      answer.pipe(outgoing);
    });
    onward.on('error', () => (outgoing.headersSent ? outgoing.destroy() : sendUnreachable(outgoing)));
    outgoing.on('close', () => onward.destroy());
    incoming.pipe(onward);
  });
  server.on('upgrade', (incoming, socket, head) => {
    const onward = forward({ incoming, port: portFor(incoming.url) });
    onward.on('upgrade', (answer, onwardSocket, onwardHead) => {
      socket.write(`HTTP/1.1 101 Switching Protocols\r\n${headerLines(answer.rawHeaders)}\r\n`);
      socket.write(onwardHead);
      onwardSocket.write(head);
      onwardSocket.pipe(socket).pipe(onwardSocket);
      onwardSocket.on('error', () => socket.destroy());
      socket.on('error', () => onwardSocket.destroy());
    });
    onward.on('response', () => socket.destroy());
    onward.on('error', () => socket.destroy());
    onward.end();
  });
  return new Promise((resolve, reject) => {
    server.once('error', reject);
    server.listen(port, 'localhost', () => resolve(server));
  });
}

/** A prefix fits whole path segments: /sell fits /sell and /sell/lots, not /seller. */
const fits = (url, prefix) =>
  prefix === '/' || url === prefix || (/^[/?]/.test(url.slice(prefix.length)) && url.startsWith(prefix));

// The Host header is passed on as it came: links, cookies and the same-origin check hang on it.
const forward = ({ incoming, port }) =>
  request({ host: '127.0.0.1', port, method: incoming.method, path: incoming.url, headers: incoming.headers });

function sendUnreachable(outgoing) {
  outgoing.writeHead(502, { 'content-type': 'text/plain; charset=utf-8' });
  outgoing.end('This part of Lydite is restarting. Reload in a moment; its log lies in .local/logs.\n');
}

function headerLines(raw) {
  let lines = '';
  for (let i = 0; i < raw.length; i += 2) lines += `${raw[i]}: ${raw[i + 1]}\r\n`;
  return lines;
}
