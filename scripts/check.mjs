#!/usr/bin/env node
import { join } from 'node:path';
import { runGates } from './checks/gates.mjs';
import { Tally } from './checks/tally.mjs';
import { runVitest } from './checks/vitest.mjs';
import { runScript } from './lib/main.mjs';
import { assertNodeVersion, ensurePackages } from './lib/packages.mjs';
import { localDir } from './lib/root.mjs';

const usage = `The quick gate: types, lint, import rules, format and the unit tests. Needs no database; one
check compares the valuation in Node and in Chromium, which is installed when missing.

usage: npm run check`;

await runScript({
  usage,
  async run() {
    assertNodeVersion();
    await ensurePackages({ logDir: join(localDir, 'logs') });
    const tally = new Tally();
    await runGates(tally);
    await runVitest({ name: 'Unit tests', projects: ['!db'], tally });
    tally.close();
  },
});
