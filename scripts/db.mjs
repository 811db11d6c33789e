#!/usr/bin/env node
import { spawnSync } from 'node:child_process';
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { ensureBuilds } from './lib/build.mjs';
import { isTaken } from './lib/lock.mjs';
import { Refusal, runScript } from './lib/main.mjs';
import { ensurePackages } from './lib/packages.mjs';
import { fromRoot, localDir, root } from './lib/root.mjs';
import { Stack } from './stack/stack.mjs';

const usage = `Runs one of the API's commands against the local stack; starts what it needs when Lydite does not run.

usage: node scripts/db.mjs <command> [arguments]

  migrate                        bring the database to the newest migration
  seed                           fill an empty database with the demo market
  ledger-check                   prove that the ledger balances and equals the processor's balance
  operators-first MAIL MAIL      name the first two operators`;

const commands = ['migrate', 'seed', 'ledger-check', 'operators-first'];

await runScript({
  usage,
  words: true,
  async run({ positionals: [name, ...args] }) {
    if (!commands.includes(name)) throw new Refusal(usage, { exitCode: 2 });
    const logDir = join(localDir, 'logs');
    await ensurePackages({ logDir });
    await ensureBuilds({ logDir });
    if (isTaken(localDir)) runBesideTheStack({ name, args });
    else await runAlone({ name, args });
  },
});

/** While Lydite runs, its environment lies in a file; the command joins it. */
function runBesideTheStack({ name, args }) {
  const kept = JSON.parse(readFileSync(join(localDir, 'environment.json'), 'utf8'));
  const env = { ...process.env, ...kept };
  const program = fromRoot('apps/api/dist/command.js');
  process.exitCode = spawnSync(process.execPath, [program, name, ...args], { cwd: root, env, stdio: 'inherit' }).status;
}

async function runAlone({ name, args }) {
  const stack = await Stack.open({ dir: localDir, database: 'lydite', web: 4400 });
  try {
    await stack.startPostgres();
    await stack.startStandIns();
    if (name === 'seed') await stack.seed();
    else process.stdout.write(await stack.command({ name, args }));
  } finally {
    await stack.stop();
  }
}
