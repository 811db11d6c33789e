import { catalogue20261, estimateLot } from '@lydite/valuation';
import { benchInput } from './bench-input.ts';
import { startNumpy } from './numpy-process.ts';
import { plainEstimate } from './plain-estimate.ts';
import { sixLineLot } from './six-line-lot.ts';

export interface Timing {
  name: string;
  medianMs: number;
  bestMs: number;
  runs: number;
  /** Middle of the lot's gold, grams: the rivals must agree on it. */
  middleG: number;
}

const warmUps = 32;
const rounds = 80;
/** The plain loop is so slow that a few runs tell enough. */
const plainEvery = 16;

/** Times the estimate and its rivals in turns, so that whatever else the machine does meets all alike. */
export async function benchEstimate(python: string | null): Promise<Timing[]> {
  const input = benchInput();
  const numpy = python === null ? null : await startNumpy(python, input);
  const taken: Record<string, number[]> = { lydite: [], numpy: [], plain: [] };
  const middles: Record<string, number[]> = { lydite: [], numpy: [], plain: [] };
  for (let round = -warmUps; round < rounds; round += 1) {
    const runs: Record<string, { ms: number; middleG: number }> = {
      lydite: timed(() => estimateLot(sixLineLot, catalogue20261, { seed: round + warmUps }).goldG.quantiles.p50),
    };
    if (numpy) runs.numpy = await numpy.run(round + warmUps);
    if (round % plainEvery === 0) runs.plain = timed(() => plainEstimate(input).quantiles[5] as number);
    if (round < 0) continue;
    for (const [name, { ms, middleG }] of Object.entries(runs)) {
      taken[name]?.push(ms);
      middles[name]?.push(middleG);
    }
  }
  numpy?.stop();
  const names = { lydite: 'Lydite', numpy: `NumPy ${numpy?.version ?? ''}`, plain: 'plain loop, Box–Muller' };
  return Object.entries(names).flatMap(([key, name]) => {
    const times = taken[key] as number[];
    if (times.length === 0) return [];
    return [
      {
        name,
        medianMs: middleOf(times),
        bestMs: Math.min(...times),
        runs: times.length,
        middleG: middleOf(middles[key] as number[]),
      },
    ];
  });
}

function timed(work: () => number): { ms: number; middleG: number } {
  const start = performance.now();
  const middleG = work();
  return { ms: performance.now() - start, middleG };
}

function middleOf(values: readonly number[]): number {
  const sorted = values.toSorted((a, b) => a - b);
  return sorted[Math.floor(sorted.length / 2)] as number;
}
