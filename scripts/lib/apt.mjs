import { spawnSync } from 'node:child_process';
import { Refusal } from './main.mjs';

/** Whether this process may install system packages and change its user. */
export const isRoot = process.getuid?.() === 0;

/**
 * Installs Debian packages, if run as root on a system with apt; otherwise says what to install.
 * @throws {Refusal} exit code 3: something outside the project is missing
 */
export function installDebianPackages({ packages, what }) {
  const line = `apt-get install -y --no-install-recommends ${packages.join(' ')}`;
  if (!isRoot || !hasApt()) {
    throw new Refusal(`${what} is missing. Install it with:\n    sudo ${line}`, { exitCode: 3 });
  }
  apt({ args: ['update', '-qq'], what });
  apt({ args: [...line.split(' ').slice(1), '-qq', '-o', 'Dpkg::Options::=--force-confold'], what });
}

const hasApt = () => spawnSync('apt-get', ['--version'], { stdio: 'ignore' }).status === 0;

function apt({ args, what }) {
  const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
  const { status, stderr, stdout } = spawnSync('apt-get', args, { encoding: 'utf8', env, maxBuffer: 64 * 1024 * 1024 });
  if (status === 0) return;
  const end = `${stdout}${stderr}`.trimEnd().split('\n').slice(-12).join('\n    ');
  throw new Refusal(`${what} could not be installed (apt-get ${args[0]}):\n    ${end}`, { exitCode: 3 });
}
