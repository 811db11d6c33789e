import { Refusal } from './main.mjs';

/**
 * Runs `work` and then waits: for Ctrl-C or a signal (a calm end), or for a service to stop by itself (a Refusal with
 * the tail of its log). Whatever happens, also when `work` fails, the stack is stopped.
 */
export async function untilStopped({ stack, work, say = console.log }) {
  const told = Promise.race([signalled(), parentGone()]);
  const life = (async () => {
    await work();
    const ended = await Promise.race(stack.services.map(async (service) => (await service.exited, service)));
    throw new Refusal(ended.report());
  })();
  try {
    await Promise.race([life, told]);
    say('\nStopping …');
  } finally {
    life.catch(() => {});
    await stack.stop();
  }
}

const signalled = () =>
  new Promise((resolve) => {
    for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => resolve());
  });

/** npm passes SIGTERM to the shell between it and this process, which dies of it without a word to us. */
const parentGone = () =>
  new Promise((resolve) => {
    if (process.env.npm_lifecycle_event === undefined) return;
    const parent = process.ppid;
    setInterval(() => process.ppid !== parent && resolve(), 500).unref();
  });
