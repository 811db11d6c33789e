#!/usr/bin/env node
import { join } from 'node:path';
import { runGates } from './checks/gates.mjs';
import { Tally } from './checks/tally.mjs';
import { runVitest } from './checks/vitest.mjs';
import { runScript } from './lib/main.mjs';
import { assertNodeVersion, ensurePackages } from './lib/packages.mjs';
import { localDir } from './lib/root.mjs';

const unitProjects = ['valuation', 'contracts', 'ui', 'client', 'fakes', 'api', 'buyer', 'seller', 'desk'];

const usage = `The quick gate: types, lint, import rules, format and the unit tests. Needs no database and no browser;
"npm test" adds the published values and the tests of the repository itself.

usage: npm run check`;

await runScript({
  usage,
  async run() {
    assertNodeVersion();
    await ensurePackages({ logDir: join(localDir, 'logs') });
    const tally = new Tally();
    await runGates(tally);
    // Left to "npm test": the checks against published values, which need Chromium, and those of the repository itself.
    await runVitest({ name: 'Unit tests', projects: unitProjects, tally });
    tally.close();
  },
});
