import { percentOf } from '../lot/quantiles.ts';
import type { Estimate, Quantiles } from '../types.ts';

/**
 * Share of an estimate's gold distribution that lies below a mass, 0 … 1, between the stored quantiles by straight lines.
 * Beyond p0.15 and p99.85 it is 0.0015 and 0.9985 at most: the estimate says no more.
 */
export function rankIn({ goldG, beadsG }: Pick<Estimate, 'goldG' | 'beadsG'>, massG: number): number {
  const points = new Map(beadsG.map((bead, i) => [(i + 0.5) / beadsG.length, bead]));
  for (const [name, percent] of Object.entries(percentOf)) {
    points.set(percent / 100, goldG.quantiles[name as keyof Quantiles]);
  }
  const ascending = [...points].sort(([a], [b]) => a - b);
  const after = ascending.findIndex(([, at]) => at > massG);
  if (after <= 0) return (after === 0 ? ascending[0] : ascending.at(-1))?.[0] as number;
  const [[below, low], [above, high]] = ascending.slice(after - 1, after + 1) as [[number, number], [number, number]];
  return below + ((massG - low) / (high - low)) * (above - below);
}
