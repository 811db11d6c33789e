import { createHash } from 'node:crypto';
import { existsSync, readdirSync, readFileSync, statSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { runCommand } from './commands.mjs';
import { fromRoot, root } from './root.mjs';

const shared = ['packages/client', 'packages/contracts', 'packages/ui', 'packages/valuation'];
const targets = [
  { folder: 'apps/api', inputs: shared },
  { folder: 'apps/buyer', inputs: shared },
  { folder: 'apps/seller', inputs: shared },
  { folder: 'apps/desk', inputs: shared },
  { folder: 'packages/fakes', inputs: [] },
];

/**
 * Builds what changed since its last build; two at a time, for a machine of two cores.
 * A build is known by the hash of its sources, kept inside its dist folder, which every build empties.
 */
export async function ensureBuilds({ logDir }) {
  const stale = targets.filter((target) => readStamp(target) !== hashOf(target));
  const waiting = [...stale];
  const work = async () => {
    for (let target = waiting.shift(); target; target = waiting.shift()) await build({ target, logDir });
  };
  await Promise.all([work(), work()]);
  return stale.length === 0 ? 'nothing changed, checked' : `${stale.length} of ${targets.length} built`;
}

const stampFile = ({ folder }) => fromRoot(folder, 'dist/.sources');
const readStamp = (target) => (existsSync(stampFile(target)) ? readFileSync(stampFile(target), 'utf8') : '');

async function build({ target, logDir }) {
  const stamp = hashOf(target);
  await runCommand({
    command: process.execPath,
    args: [join(root, 'node_modules/vite/bin/vite.js'), 'build', '--logLevel', 'warn'],
    cwd: fromRoot(target.folder),
    env: { ...process.env, NODE_ENV: 'production', NO_COLOR: '1' },
    logFile: join(logDir, `build-${target.folder.replaceAll('/', '-')}.log`),
    what: `Building ${target.folder}`,
  });
  writeFileSync(stampFile(target), stamp);
}

function hashOf({ folder, inputs }) {
  const hash = createHash('sha256');
  for (const path of [folder, ...inputs, 'package-lock.json', 'tsconfig.base.json'].flatMap(filesBelow)) {
    hash
      .update(path)
      .update('\0')
      .update(readFileSync(fromRoot(path)))
      .update('\0');
  }
  return hash.digest('hex');
}

const isSource = (name) =>
  !['node_modules', 'dist', 'coverage'].includes(name) && !/\.(tsbuildinfo|test\.tsx?)$/.test(name);

function filesBelow(path) {
  if (!statSync(fromRoot(path)).isDirectory()) return [path];
  return readdirSync(fromRoot(path))
    .filter(isSource)
    .sort()
    .flatMap((name) => filesBelow(join(path, name)));
}
