import { existsSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { Refusal } from './main.mjs';
import { ensureDir } from './root.mjs';

/**
 * Lets one stack at a time use a folder, and ends what a killed one left running.
 * @returns `note(pids)` to keep the processes of this stack on file and `release()`
 * @throws {Refusal} when another stack runs in the folder
 */
export function takeLock(dir) {
  const last = readLock(ensureDir(dir));
  if (isTaken(dir)) {
    throw new Refusal(
      `Lydite already runs from this folder (process ${last.owner.pid}). Stop it first (Ctrl-C there).`,
    );
  }
  for (const service of last.services.filter(isSame)) process.kill(-service.pid, 'SIGKILL');
  const owner = identify(process.pid);
  const file = lockFile(dir);
  const write = (services) => writeFileSync(file, JSON.stringify({ owner, services }));
  write([]);
  return { note: (pids) => write(pids.map(identify)), release: () => rmSync(file, { force: true }) };
}

/** Whether a stack runs in the folder now. */
export function isTaken(dir) {
  const { owner } = readLock(dir);
  return owner !== undefined && isSame(owner);
}

const lockFile = (dir) => join(dir, 'running.json');
const readLock = (dir) =>
  existsSync(lockFile(dir)) ? JSON.parse(readFileSync(lockFile(dir), 'utf8')) : { owner: undefined, services: [] };

// A number is given to another process later; together with the time of its start it names one process only.
const identify = (pid) => ({ pid, startedAt: startTime(pid) });
const isSame = ({ pid, startedAt }) => startedAt !== undefined && startTime(pid) === startedAt;

function startTime(pid) {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, 'utf8');
    return stat.slice(stat.lastIndexOf(')') + 2).split(' ')[19];
  } catch {
    return undefined;
  }
}
