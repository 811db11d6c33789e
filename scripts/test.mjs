#!/usr/bin/env node
import { join } from 'node:path';
import { runBrowserTests } from './checks/browser.mjs';
import { runGates } from './checks/gates.mjs';
import { Tally } from './checks/tally.mjs';
import { runVitest } from './checks/vitest.mjs';
import { Refusal, runScript } from './lib/main.mjs';
import { assertNodeVersion, ensurePackages } from './lib/packages.mjs';
import { localDir } from './lib/root.mjs';
import { createSteps } from './lib/steps.mjs';
import { isRunning, openCluster, startCluster, stopCluster } from './postgres/cluster.mjs';
import { ensureDatabase } from './postgres/database.mjs';

const usage = `Runs everything: types, lint, import rules, format, unit, database and browser tests.
Sets up what it needs by itself; the last line is "N passed, N failed".

usage: npm test [-- --only unit|db|e2e] [--long]

  --only PART   unit: the gates and the unit tests; db: those that need PostgreSQL; e2e: those in the browser
  --long        more screen sizes and colour schemes, longer simulations`;

const parts = ['unit', 'db', 'e2e'];

await runScript({
  usage,
  options: { only: { type: 'string' }, long: { type: 'boolean', default: false } },
  async run({ values: { only, long } }) {
    if (only !== undefined && !parts.includes(only)) throw new Refusal(usage, { exitCode: 2 });
    const wants = (part) => only === undefined || only === part;
    const tally = new Tally();
    try {
      await runParts({ wants, long, tally });
    } catch (error) {
      console.error(error instanceof Refusal ? error.message : error);
      tally.addGate('Set-up', false);
    }
    tally.close();
  },
});

async function runParts({ wants, long, tally }) {
  const step = createSteps({ total: 2 });
  await step('Node', assertNodeVersion);
  await step('Packages', () => ensurePackages({ logDir: join(localDir, 'logs') }));
  const env = { LYDITE_LONG: long ? '1' : '' };
  if (wants('unit')) {
    await runGates(tally);
    await runVitest({ name: 'Unit tests', projects: ['!db'], tally, live: true, env });
  }
  if (!wants('db') && !wants('e2e')) return;
  await withTestCluster(async () => {
    if (wants('db')) await runVitest({ name: 'Database tests', projects: ['db'], tally, live: true, env });
    if (wants('e2e')) await runBrowserTests({ tally, long });
  });
}

/** Keeps the tests' cluster up for all parts, and stops it unless someone else had started it. */
async function withTestCluster(work) {
  const cluster = openCluster({ fast: true });
  const wasRunning = isRunning(cluster);
  await startCluster(cluster);
  ensureDatabase({ cluster, database: 'lydite' });
  try {
    await work();
  } finally {
    if (!wasRunning) stopCluster(cluster);
  }
}
