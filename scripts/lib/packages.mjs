import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { runCommand } from './commands.mjs';
import { Refusal } from './main.mjs';
import { fromRoot, root } from './root.mjs';

/** @throws {Refusal} when this Node is older than package.json's "engines" wants */
export function assertNodeVersion() {
  const wanted = JSON.parse(readFileSync(fromRoot('package.json'), 'utf8')).engines.node.replace('>=', '');
  const [major, minor] = wanted.split('.').map(Number);
  const [ownMajor, ownMinor] = process.versions.node.split('.').map(Number);
  if (ownMajor > major || (ownMajor === major && ownMinor >= minor)) return `Node ${process.versions.node}`;
  throw new Refusal(`Node ${wanted} or newer is needed; this is ${process.versions.node}.`, { exitCode: 3 });
}

/** Installs the locked packages with `npm ci`, only when what is installed differs from the lock. */
export async function ensurePackages({ logDir }) {
  if (installedEqualsLocked()) return 'as locked, checked';
  await runCommand({
    command: 'npm',
    args: ['ci', '--no-audit', '--no-fund', '--loglevel=error'],
    logFile: join(logDir, 'npm-ci.log'),
    env: { ...process.env, npm_config_loglevel: 'error' },
    what: 'npm ci',
  });
  return 'installed';
}

/** npm lists what it installed in node_modules/.package-lock.json, as the last thing it does. */
export function installedEqualsLocked(folder = root) {
  const installedFile = join(folder, 'node_modules/.package-lock.json');
  if (!existsSync(installedFile)) return false;
  const locked = readPackages(join(folder, 'package-lock.json'));
  const installed = readPackages(installedFile);
  return Object.entries(locked)
    .filter(([path, entry]) => path.includes('node_modules/') && !entry.optional && !entry.devOptional)
    .every(([path, { version }]) => installed[path] !== undefined && installed[path].version === version);
}

const readPackages = (file) => JSON.parse(readFileSync(file, 'utf8')).packages;
