import { spawnSync } from 'node:child_process';
import { appendFileSync, existsSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { Refusal } from '../lib/main.mjs';
import { freePort, isPortFree } from '../lib/ports.mjs';
import { fromRoot } from '../lib/root.mjs';
import { readOrMakeSecrets } from '../lib/secrets.mjs';
import { serverBinaries } from './server-binaries.mjs';
import { giveTo, makePrivateDir, reachableHome, serverIds, socketDir } from './system-user.mjs';

/** Settings that lose data when the machine stops: for tests only. */
const fastSettings = [
  'fsync = off',
  'synchronous_commit = off',
  'full_page_writes = off',
  'wal_level = minimal',
  'max_wal_senders = 0',
  'autovacuum = off',
];

/**
 * Opens the private cluster of this checkout (making nothing yet): .local/postgres, or .local/postgres-test when fast.
 * @param {{fast: boolean}} kind
 */
export function openCluster({ fast }) {
  const wished = fromRoot('.local', fast ? 'postgres-test' : 'postgres');
  const bin = serverBinaries();
  const ids = serverIds();
  const home = reachableHome({ wished, ids });
  const cluster = {
    fast,
    bin,
    ids,
    home,
    data: join(home, 'data'),
    log: join(home, 'data/server.log'),
    portFile: join(home, 'port'),
    passwords: readOrMakeSecrets({
      file: join(home, 'passwords.json'),
      names: ['superuser', 'owner', 'app', 'jobs'],
    }),
  };
  return cluster;
}

/** The port the cluster listens on (or did last). */
export const portOf = (cluster) => Number(readFileSync(cluster.portFile, 'utf8'));

const run = (cluster, command, args, options = {}) =>
  spawnSync(join(cluster.bin, command), args, { encoding: 'utf8', cwd: '/', ...cluster.ids, ...options });

function must(cluster, command, args, options) {
  const { status, stdout, stderr } = run(cluster, command, args, options);
  if (status === 0) return stdout;
  const log = existsSync(cluster.log) ? readFileSync(cluster.log, 'utf8').slice(-1_500) : '';
  throw new Refusal(`PostgreSQL: ${command} failed (${status}).\n${stderr}${log}`);
}

/** Whether the cluster's server runs. */
export const isRunning = (cluster) =>
  existsSync(join(cluster.data, 'PG_VERSION')) && run(cluster, 'pg_ctl', ['-D', cluster.data, 'status']).status === 0;

/** Makes the cluster if there is none and starts its server if it does not run. */
export async function startCluster(cluster) {
  if (!existsSync(join(cluster.data, 'PG_VERSION'))) initialise(cluster);
  if (isRunning(cluster)) return;
  const last = existsSync(cluster.portFile) ? portOf(cluster) : 0;
  const port = last && (await isPortFree(last)) ? last : await freePort();
  writeFileSync(cluster.portFile, `${port}\n`);
  writeSettings({ cluster, port });
  must(cluster, 'pg_ctl', ['-D', cluster.data, '-l', cluster.log, '-w', '-t', '60', 'start'], { stdio: 'ignore' });
}

/** Stops the server, ending open sessions; does nothing when it does not run. */
export function stopCluster(cluster) {
  if (isRunning(cluster)) must(cluster, 'pg_ctl', ['-D', cluster.data, '-m', 'fast', '-w', '-t', '30', 'stop']);
}

/** Stops the server and throws its data away. */
export function removeCluster(cluster) {
  stopCluster(cluster);
  rmSync(cluster.data, { recursive: true, force: true });
}

function initialise(cluster) {
  rmSync(cluster.data, { recursive: true, force: true });
  makePrivateDir({ path: cluster.data, ids: cluster.ids });
  const passwordFile = join(cluster.home, 'initdb-password');
  writeFileSync(passwordFile, `${cluster.passwords.superuser}\n`, { mode: 0o600 });
  giveTo({ path: passwordFile, ids: cluster.ids });
  const durability = cluster.fast ? ['--no-sync'] : ['--data-checksums'];
  const identity = ['-U', 'postgres', `--pwfile=${passwordFile}`, '--auth=scram-sha-256'];
  try {
    must(cluster, 'initdb', ['-D', cluster.data, ...identity, '--encoding=UTF8', '--locale=C.UTF-8', ...durability]);
  } catch (error) {
    rmSync(cluster.data, { recursive: true, force: true });
    throw error;
  } finally {
    rmSync(passwordFile, { force: true });
  }
  appendFileSync(join(cluster.data, 'postgresql.conf'), "include 'local.conf'\n");
}

function writeSettings({ cluster, port }) {
  const sockets = socketDir(cluster.home);
  makePrivateDir({ path: sockets, ids: cluster.ids });
  const settings = [
    "listen_addresses = '127.0.0.1'",
    `port = ${port}`,
    `unix_socket_directories = '${sockets}'`,
    'max_connections = 100',
    'shared_buffers = 128MB',
    "timezone = 'UTC'",
    'log_min_duration_statement = 1s',
    // A slow statement is worth a line; what it was called with (hashes, addresses) is not.
    'log_parameter_max_length = 0',
    'idle_in_transaction_session_timeout = 60s',
    ...(cluster.fast ? fastSettings : []),
  ];
  const file = join(cluster.data, 'local.conf');
  writeFileSync(file, `${settings.join('\n')}\n`);
  giveTo({ path: file, ids: cluster.ids });
}
