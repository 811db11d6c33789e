#!/usr/bin/env node
import { join } from 'node:path';
import { ensureBuilds } from './lib/build.mjs';
import { readPort, runScript } from './lib/main.mjs';
import { assertNodeVersion, ensurePackages } from './lib/packages.mjs';
import { localDir } from './lib/root.mjs';
import { createSteps, secondsSince } from './lib/steps.mjs';
import { untilStopped } from './lib/until-stopped.mjs';
import { Stack } from './stack/stack.mjs';
import { welcome } from './stack/welcome.mjs';

const usage = `Starts the whole of Lydite with its demo market and prints its address. Ctrl-C stops everything.

usage: npm start [-- --fresh] [--port N]

  --fresh     begin anew: throw away the local database, files and payments
  --port N    the web site's port (default 4400; the next free one if taken)`;

await runScript({
  usage,
  options: { fresh: { type: 'boolean', default: false }, port: { type: 'string' } },
  async run({ values }) {
    const startMs = performance.now();
    const logDir = join(localDir, 'logs');
    const web = readPort(values.port) ?? 4400;
    const step = createSteps({ total: 8 });
    await step('Node', assertNodeVersion);
    await step('Packages', () => ensurePackages({ logDir }));
    await step('Builds', () => ensureBuilds({ logDir }));
    const stack = await Stack.open({ dir: localDir, database: 'lydite', web });
    await untilStopped({
      stack,
      async work() {
        await step('PostgreSQL', () => stack.startPostgres({ fresh: values.fresh }));
        await step('Stand-ins for payments, mail and prices', () => stack.startStandIns());
        await step('Migrations', () => stack.command({ name: 'migrate' }).then(() => 'done'));
        await step('Demo market', () => stack.seed());
        await step('API and worker', () => stack.startApi());
        console.log(welcome({ stack, dir: localDir, took: secondsSince(startMs), wishedPort: web }));
      },
    });
    console.log('Everything has stopped.');
  },
});
