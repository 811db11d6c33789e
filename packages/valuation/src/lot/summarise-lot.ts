import { quantileOf } from '../quantity/quantile.ts';
import type { Estimate, LineEstimate, Quantiles } from '../types.ts';
import { ascending } from './ascending.ts';
import { densityOf } from './density.ts';
import { driversOf } from './drivers.ts';
import type { LinePlan, Term } from './lot-plan.types.ts';
import { meanAndVariance, quantilesOf, sortedQuantile, spreadOf } from './quantiles.ts';
import type { LotDraws } from './simulate-lot.ts';

/** Goes up whenever the same input could give other numbers. */
export const modelVersion = '1.0';

const beads = 50;

/** Sums up the draws of a lot as an estimate: plain JSON, and all that a frozen estimate keeps. */
export function summariseLot(draws: LotDraws): Estimate {
  const { plan, goldG, massG, seed, catalogue, input } = draws;
  const sorted = ascending(goldG);
  const spread = spreadOf(sorted);
  const lines = summariseLines(draws);
  return {
    modelVersion,
    catalogueVersion: catalogue.version,
    seed,
    draws: draws.draws,
    massG: sortedQuantile(ascending(massG), 0.5),
    goldG: spread,
    gradeGPerT: gradesOf(goldG, massG),
    beadsG: Array.from({ length: beads }, (_, i) => sortedQuantile(sorted, (i + 0.5) / beads)),
    density: densityOf(sorted),
    lines,
    drivers: driversOf({ input, catalogue, plan, seed, lines, quantiles: spread.quantiles }),
    warnings: plan.warnings,
  };
}

function summariseLines({ plan, lines, goldG }: LotDraws): LineEstimate[] {
  const total = meanAndVariance(goldG);
  return lines.map((line, index) => {
    const { input, materialClass, gold, mass } = plan.lines[index] as LinePlan;
    const spread = spreadOf(ascending(line.goldG));
    return {
      id: input.id,
      classCode: materialClass.code,
      massG: medianOf(mass, line.massG),
      pieces: input.pieces,
      goldG: spread,
      gradeGPerT: gradesOf(line.goldG, line.massG),
      varianceShare: total.variance > 0 ? covariance(line.goldG, spread.mean, goldG, total.mean) / total.variance : 0,
      components: gold.map(({ name }, i) => ({
        name,
        goldG: gold.length === 1 ? spread : spreadOf(ascending(line.components[i] as Float64Array)),
      })),
    };
  });
}

/** Middle of a mass; known without draws, and so to the last digit as it was given, unless it is a product of several figures. */
function medianOf(mass: Term | null, drawnG: Float64Array): number {
  if (!mass) return 0;
  const [only, ...others] = mass.factors;
  if (others.length > 0) return sortedQuantile(ascending(drawnG), 0.5);
  return only ? mass.constant * quantileOf(only.quantity, 0.5) ** only.power : mass.constant;
}

/** Quantiles of gold over mass, draw by draw, in g/t; 0 where there is no mass. */
function gradesOf(goldG: Float64Array, massG: Float64Array): Quantiles {
  const grades = new Float64Array(goldG.length);
  for (let i = 0; i < grades.length; i += 1) {
    const mass = massG[i] as number;
    if (mass > 0) grades[i] = ((goldG[i] as number) / mass) * 1e6;
  }
  return quantilesOf(ascending(grades));
}

function covariance(a: Float64Array, meanA: number, b: Float64Array, meanB: number): number {
  let sum = 0;
  for (let i = 0; i < a.length; i += 1) sum += ((a[i] as number) - meanA) * ((b[i] as number) - meanB);
  return sum / (a.length - 1);
}
