import { spawn } from 'node:child_process';
import { createInterface } from 'node:readline';
import { fileURLToPath } from 'node:url';
import type { BenchInput } from './bench-input.ts';

const script = fileURLToPath(new URL('numpy-estimate.py', import.meta.url));

export interface NumpyProcess {
  version: string;
  run: (seed: number) => Promise<{ ms: number; middleG: number }>;
  stop: () => void;
}

/** Starts the NumPy side, which times itself and so is not charged for the pipe between. */
export async function startNumpy(python: string, input: BenchInput): Promise<NumpyProcess> {
  const child = spawn(python, [script], { stdio: ['pipe', 'pipe', 'inherit'] });
  const lines = createInterface({ input: child.stdout })[Symbol.asyncIterator]();
  const ask = async (text: string) => {
    child.stdin.write(`${text}\n`);
    const { value, done } = await lines.next();
    if (done) throw new Error('the NumPy side ended');
    return JSON.parse(value) as Record<string, number>;
  };
  const { numpy } = (await ask(JSON.stringify({ ...input, afterPlans: changedLines(input) }))) as unknown as {
    numpy: string;
  };
  return {
    version: numpy,
    run: async (seed) => {
      const { ms, p50 } = await ask(`${seed}`);
      return { ms: ms as number, middleG: p50 as number };
    },
    stop: () => child.stdin.end(),
  };
}

/** Lines that a measurement leaves as they were are named by null, so that neither side draws them again. */
const changedLines = ({ plan, afterPlans }: BenchInput) =>
  afterPlans.map(({ lines }) => lines.map((line, i) => (line === plan.lines[i] ? null : line)));
