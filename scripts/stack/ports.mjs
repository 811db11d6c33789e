import { nextFreePort } from '../lib/ports.mjs';

/**
 * Chooses the ports of one stack, counting up from the wished address of the web site.
 * @param {{web: number, clients?: string[]}} wish `clients` names the dev servers that need one each
 */
export async function choosePorts({ web, clients = [] }) {
  const taken = new Set();
  const next = (preferred) => nextFreePort({ preferred, taken });
  const ports = {
    web: await next(web),
    payments: await next(web + 1),
    mail: await next(web + 2),
    prices: await next(web + 3),
    smtp: await next(web + 4),
  };
  if (clients.length === 0) return { ...ports, api: ports.web };
  ports.api = await next(web + 5);
  for (const client of clients) ports[client] = await next(web + 6);
  return ports;
}
