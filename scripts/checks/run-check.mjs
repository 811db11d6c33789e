import { spawn } from 'node:child_process';
import { root } from '../lib/root.mjs';
import { secondsSince } from '../lib/steps.mjs';

const limitMs = 20 * 60_000;

/**
 * Runs one check to its end.
 * @param {{name: string, args: string[], env?: object, live?: boolean}} check `args` are Node's; `live` shows the output
 *   as it comes, otherwise it is shown only when the check fails
 * @returns {Promise<{ok: boolean, output: string}>}
 */
export async function runCheck({ name, args, env = {}, live = false }) {
  const startMs = performance.now();
  process.stdout.write(live ? `\n${name}\n` : `${name} … `);
  const child = spawn(process.execPath, args, {
    cwd: root,
    env: { ...process.env, ...env },
    stdio: ['ignore', 'pipe', 'pipe'],
    timeout: limitMs,
  });
  let output = '';
  for (const stream of [child.stdout, child.stderr]) {
    stream.setEncoding('utf8').on('data', (text) => {
      output += text;
      if (live) process.stdout.write(text);
    });
  }
  const code = await new Promise((resolve) => {
    child.once('error', () => resolve('could not start'));
    child.once('close', (exitCode, signal) => resolve(exitCode ?? signal));
  });
  const ok = code === 0;
  console.log(`${live ? `${name}: ` : ''}${ok ? 'passed' : `failed (${code})`} in ${secondsSince(startMs)}`);
  if (!ok && !live) console.log(output.trimEnd());
  return { ok, output };
}
