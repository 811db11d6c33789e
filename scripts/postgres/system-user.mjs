import { execFileSync, spawnSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { chmodSync, chownSync, mkdirSync, readFileSync } from 'node:fs';
import { isRoot } from '../lib/apt.mjs';

const short = (text) => createHash('sha256').update(text).digest('hex').slice(0, 12);

/** The user and group the server runs as: PostgreSQL refuses to run as root. Empty for an ordinary user. */
export function serverIds() {
  if (!isRoot) return {};
  if (!passwdRow('postgres')) {
    execFileSync('useradd', ['--system', '--no-create-home', '--shell', '/usr/sbin/nologin', 'postgres']);
  }
  const [, , uid, gid] = passwdRow('postgres');
  return { uid: Number(uid), gid: Number(gid) };
}

const passwdRow = (name) =>
  readFileSync('/etc/passwd', 'utf8')
    .split('\n')
    .map((line) => line.split(':'))
    .find(([user]) => user === name);

/** The wished folder, or one below /var/tmp where the server's user can't walk down to it (as below /root). */
export function reachableHome({ wished, ids }) {
  mkdirSync(wished, { recursive: true });
  if (!isRoot) return wished;
  if (spawnSync('test', ['-x', wished], { ...ids, cwd: '/' }).status === 0) return wished;
  const home = `/var/tmp/lydite-postgres-${short(wished)}`;
  mkdirSync(home, { recursive: true });
  return home;
}

/** A folder for the server's socket; its path must fit the 107 bytes a socket address holds. */
export function socketDir(home) {
  const inside = `${home}/s`;
  return Buffer.byteLength(`${inside}/.s.PGSQL.65535.lock`) <= 107 ? inside : `/tmp/lydite-${short(home)}`;
}

/** Makes a folder only the server's user may enter. */
export function makePrivateDir({ path, ids }) {
  mkdirSync(path, { recursive: true, mode: 0o700 });
  giveTo({ path, ids });
  chmodSync(path, 0o700);
}

/** Hands a file or folder to the server's user. */
export function giveTo({ path, ids }) {
  if (ids.uid !== undefined) chownSync(path, ids.uid, ids.gid);
}
