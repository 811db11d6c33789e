import { spawn } from 'node:child_process';
import { closeSync, openSync } from 'node:fs';
import { dirname } from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { nameOf, tailOf } from './commands.mjs';
import { Refusal } from './main.mjs';
import { ensureDir, root } from './root.mjs';

const graceMs = 8_000;

/**
 * Starts a process that should run until it is told to stop, with its output in a log file.
 * It gets its own process group, so that Ctrl-C reaches only the starter, which then stops the services in order.
 * @param {{name: string, command: string, args: string[], logFile: string, cwd?: string, env?: object}} plan
 * @returns `exited` (a promise of the reason it ended), `stop()` and `assertRuns()`
 */
export function startService({ name, command, args, logFile, cwd = root, env = process.env }) {
  ensureDir(dirname(logFile));
  const log = openSync(logFile, 'w');
  const child = spawn(command, args, { cwd, env, stdio: ['ignore', log, log], detached: true });
  closeSync(log);
  let ending;
  const exited = new Promise((resolve) => {
    child.once('error', (error) => resolve((ending = error.message)));
    child.once('exit', (code, signal) => resolve((ending = signal ?? `exit ${code}`)));
  });
  const report = () => `${name} stopped (${ending}). The end of ${nameOf(logFile)}:\n${tailOf(logFile)}`;
  return {
    name,
    pid: child.pid,
    exited,
    report,
    assertRuns() {
      if (ending !== undefined) throw new Refusal(report());
    },
    async stop() {
      if (ending !== undefined) return;
      signalGroup(child.pid, 'SIGTERM');
      const late = await Promise.race([exited.then(() => false), sleep(graceMs, true, { ref: false })]);
      if (late) signalGroup(child.pid, 'SIGKILL');
      await exited;
    },
  };
}

function signalGroup(pid, signal) {
  try {
    process.kill(-pid, signal);
  } catch (error) {
    if (error.code !== 'ESRCH') throw error;
  }
}

/**
 * Waits until an address answers 200.
 * @throws {Refusal} when one of the services ends first, or the time is up
 */
export async function waitForAnswer({ url, services, limitMs = 60_000 }) {
  const endMs = performance.now() + limitMs;
  while (performance.now() < endMs) {
    for (const service of services) service.assertRuns();
    if (await answers(url)) return;
    await sleep(100);
  }
  throw new Refusal(
    `${url} did not answer within ${limitMs / 1000} s. See ${services.map((service) => service.name).join(', ')} in the log folder.`,
  );
}

async function answers(url) {
  try {
    const response = await fetch(url, { signal: AbortSignal.timeout(2_000) });
    await response.arrayBuffer();
    return response.ok;
  } catch {
    return false;
  }
}
