import { spawnSync } from 'node:child_process';
import { existsSync, mkdirSync, readdirSync, writeFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { installDebianPackages } from '../lib/apt.mjs';
import { Refusal } from '../lib/main.mjs';

const debianBase = '/usr/lib/postgresql';
const createClusterConf = '/etc/postgresql-common/createcluster.conf';

/** The folder of initdb and pg_ctl; installs the server through apt, as root, when it is missing. */
export function serverBinaries() {
  const found = findBinaries();
  if (found) return found;
  keepDebianFromMakingItsOwnCluster();
  installDebianPackages({ packages: ['postgresql'], what: "PostgreSQL's server" });
  const installed = findBinaries();
  if (!installed) throw new Refusal("PostgreSQL's server was installed, but initdb is not there.", { exitCode: 3 });
  return installed;
}

function findBinaries() {
  const versions = existsSync(debianBase) ? readdirSync(debianBase) : [];
  const newest = versions
    .filter((version) => existsSync(join(debianBase, version, 'bin/initdb')))
    .sort((a, b) => Number(b) - Number(a))[0];
  if (newest) return join(debianBase, newest, 'bin');
  const { status, stdout } = spawnSync('sh', ['-c', 'command -v initdb'], { encoding: 'utf8' });
  return status === 0 ? dirname(stdout.trim()) : undefined;
}

function keepDebianFromMakingItsOwnCluster() {
  if (process.getuid?.() !== 0 || existsSync(createClusterConf)) return;
  mkdirSync(dirname(createClusterConf), { recursive: true });
  writeFileSync(createClusterConf, "create_main_cluster = false\nstart_conf = 'manual'\n");
}
