import { parseArgs } from 'node:util';

/** A failure the person at the keyboard can mend: printed as its message alone, without a stack. */
export class Refusal extends Error {
  constructor(message, { exitCode = 1 } = {}) {
    super(message);
    this.exitCode = exitCode;
  }
}

/**
 * Runs a script: prints its usage for --help, refuses unknown options, and words unless it takes some (exit 2), turns a Refusal into a plain line.
 * @param {{usage: string, options?: object, words?: boolean, run: (args: {values: object, positionals: string[]}) => unknown}} script
 */
export async function runScript({ usage, options = {}, words = false, run }) {
  try {
    const args = readArgs({ usage, options, words });
    if (args.values.help) console.log(usage);
    else await run(args);
  } catch (error) {
    console.error(error instanceof Refusal ? `\n${error.message}` : error);
    process.exitCode = error instanceof Refusal ? error.exitCode : 1;
  }
}

function readArgs({ usage, options, words }) {
  try {
    return parseArgs({ allowPositionals: words, options: { ...options, help: { type: 'boolean', short: 'h' } } });
  } catch (error) {
    throw new Refusal(`${error.message}\n\n${usage}`, { exitCode: 2 });
  }
}

/** The number given for a port option, or undefined when none was given. */
export function readPort(text) {
  if (text === undefined) return undefined;
  const port = Number(text);
  if (!Number.isInteger(port) || port < 1 || port > 65_535) {
    throw new Refusal(`--port wants a number from 1 to 65535, not "${text}".`, { exitCode: 2 });
  }
  return port;
}
