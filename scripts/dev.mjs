#!/usr/bin/env node
import { join } from 'node:path';
import { serveOneOrigin } from './dev/one-origin.mjs';
import { readPort, runScript } from './lib/main.mjs';
import { assertNodeVersion, ensurePackages } from './lib/packages.mjs';
import { fromRoot, localDir } from './lib/root.mjs';
import { waitForAnswer } from './lib/services.mjs';
import { createSteps, secondsSince } from './lib/steps.mjs';
import { untilStopped } from './lib/until-stopped.mjs';
import { Stack } from './stack/stack.mjs';
import { welcome } from './stack/welcome.mjs';

const usage = `Starts Lydite from its sources: the clients reload, the API and the worker restart when a file changes.

usage: npm run dev [-- --fresh] [--port N]

  --fresh     begin anew: throw away the local database, files and payments
  --port N    the web site's port (default 4400; the next free one if taken)`;

/** The clients and where each lies below the one address. */
const clients = { buyer: '/', seller: '/sell', desk: '/desk' };

await runScript({
  usage,
  options: { fresh: { type: 'boolean', default: false }, port: { type: 'string' } },
  async run({ values }) {
    const startMs = performance.now();
    const web = readPort(values.port) ?? 4400;
    const step = createSteps({ total: 8 });
    await step('Node', assertNodeVersion);
    await step('Packages', () => ensurePackages({ logDir: join(localDir, 'logs') }));
    const stack = await Stack.open({
      dir: localDir,
      database: 'lydite',
      web,
      watch: true,
      clients: Object.keys(clients),
    });
    await untilStopped({
      stack,
      async work() {
        await step('PostgreSQL', () => stack.startPostgres({ fresh: values.fresh }));
        await step('Stand-ins for payments, mail and prices', () => stack.startStandIns());
        await step('Migrations', () => stack.command({ name: 'migrate' }).then(() => 'done'));
        await step('Demo market', () => stack.seed());
        await step('API and worker', () => stack.startApi());
        await step('Clients', () => startClients(stack));
        console.log(welcome({ stack, dir: localDir, took: secondsSince(startMs), wishedPort: web }));
      },
    });
    console.log('Everything has stopped.');
    process.exit();
  },
});

async function startClients(stack) {
  const vite = fromRoot('node_modules/vite/bin/vite.js');
  for (const [name, prefix] of Object.entries(clients)) {
    const port = stack.ports[name];
    const args = [vite, '--host', '127.0.0.1', '--port', String(port), '--strictPort', '--clearScreen', 'false'];
    const service = stack.start({ name, args, cwd: fromRoot('apps', name) });
    await waitForAnswer({ url: `http://127.0.0.1:${port}${prefix === '/' ? '/' : `${prefix}/`}`, services: [service] });
  }
  const api = ['/api', '/healthz', '/readyz'].map((prefix) => ({ prefix, port: stack.ports.api }));
  const pages = Object.entries(clients).map(([name, prefix]) => ({ prefix, port: stack.ports[name] }));
  const routes = [...api, ...pages].sort((a, b) => b.prefix.length - a.prefix.length);
  await serveOneOrigin({ port: stack.ports.web, routes });
}
