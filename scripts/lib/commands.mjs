import { spawn } from 'node:child_process';
import { closeSync, existsSync, openSync, readFileSync } from 'node:fs';
import { dirname, relative } from 'node:path';
import { Refusal } from './main.mjs';
import { ensureDir, root } from './root.mjs';

/** The last lines of a log file, indented; an empty file says so. */
export function tailOf(logFile, lines = 20) {
  const text = existsSync(logFile) ? readFileSync(logFile, 'utf8').trimEnd() : '';
  const tail = text === '' ? ['(nothing was written)'] : text.split('\n').slice(-lines);
  return tail.map((line) => `    ${line}`).join('\n');
}

/** How a log file is named to a person. */
export const nameOf = (path) => relative(root, path);

/**
 * Runs a command to its end with its output in a log file.
 * @param {{command: string, args: string[], logFile: string, cwd?: string, env?: object, what: string}} job
 * @returns the text it wrote to standard output
 * @throws {Refusal} with the end of the log, when the command fails
 */
export async function runCommand({ command, args, logFile, cwd = root, env = process.env, what }) {
  ensureDir(dirname(logFile));
  const log = openSync(logFile, 'w');
  const child = spawn(command, args, { cwd, env, stdio: ['ignore', 'pipe', log] });
  let output = '';
  child.stdout.setEncoding('utf8').on('data', (text) => (output += text));
  const code = await new Promise((resolve, reject) => {
    child.once('error', reject);
    child.once('close', (exitCode, signal) => resolve(exitCode ?? signal));
  }).finally(() => closeSync(log));
  if (code !== 0) {
    const said = output.trim() === '' ? '' : `${lastLines(output)}\n`;
    throw new Refusal(`${what} failed (${code}). The end of ${nameOf(logFile)}:\n${said}${tailOf(logFile)}`);
  }
  return output;
}

const lastLines = (text) =>
  text
    .trimEnd()
    .split('\n')
    .slice(-20)
    .map((line) => `    ${line}`)
    .join('\n');
