import { quantileOf } from '../quantity/quantile.ts';
import type { Estimate, LineEstimate } from '../types.ts';
import type { PlanDraws } from './draw-plan.ts';
import { densityOf } from './density.ts';
import { driversOf } from './drivers.ts';
import type { LinePlan, Term } from './lot-plan.types.ts';
import { createQuantileFinder, type FindQuantiles } from './quantile-finder.ts';
import { meanAndVariance, medianOf, quantilesOf, spreadOf } from './quantiles.ts';
import type { LotDraws } from './simulate-lot.ts';

/** Goes up whenever the same input could give other numbers. */
export const modelVersion = '1.1';

const beads = Array.from({ length: 50 }, (_, i) => (i + 0.5) / 50);

/** Sums up the draws of a lot as an estimate: plain JSON, and all that a frozen estimate keeps. */
export function summariseLot(draws: LotDraws): Estimate {
  const { plan, goldG, massG, seed, catalogue, input } = draws;
  const find = createQuantileFinder(draws.draws);
  const spread = spreadOf(goldG, find);
  const lines = summariseLines(draws, find);
  return {
    modelVersion,
    catalogueVersion: catalogue.version,
    seed,
    draws: draws.draws,
    massG: medianOf(massG, find),
    goldG: spread,
    gradeGPerT: quantilesOf(fillGrades(new Float64Array(draws.draws), draws), find),
    beadsG: find(goldG, beads),
    density: densityOf(goldG, spread),
    lines,
    drivers: driversOf({ input, catalogue, plan, seed, lines, quantiles: spread.quantiles }),
    warnings: plan.warnings,
  };
}

function summariseLines({ plan, lines, goldG, draws }: LotDraws, find: FindQuantiles): LineEstimate[] {
  const total = meanAndVariance(goldG);
  const grades = new Float64Array(draws);
  return lines.map((line, index) => {
    const { input, materialClass, gold, mass } = plan.lines[index] as LinePlan;
    const spread = spreadOf(line.goldG, find);
    return {
      id: input.id,
      classCode: materialClass.code,
      massG: middleOf(mass, line.massG, find),
      pieces: input.pieces,
      goldG: spread,
      gradeGPerT: quantilesOf(fillGrades(grades, line), find),
      varianceShare: total.variance > 0 ? covariance(line.goldG, spread.mean, goldG, total.mean) / total.variance : 0,
      components: gold.map(({ name }, i) => ({
        name,
        goldG: gold.length === 1 ? spread : spreadOf(line.components[i] as Float64Array, find),
      })),
    };
  });
}

/** Middle of a mass; known without draws, and so to the last digit as it was given, unless it is a product of several figures. */
function middleOf(mass: Term | null, drawnG: Float64Array, find: FindQuantiles): number {
  if (!mass) return 0;
  const [only, ...others] = mass.factors;
  if (others.length > 0) return medianOf(drawnG, find);
  return only ? mass.constant * quantileOf(only.quantity, 0.5) ** only.power : mass.constant;
}

/** Gold over mass, draw by draw, in g/t; 0 where there is no mass. */
function fillGrades(grades: Float64Array, { goldG, massG }: Pick<PlanDraws, 'goldG' | 'massG'>): Float64Array {
  for (let i = 0; i < grades.length; i += 1) {
    const mass = massG[i] as number;
    grades[i] = mass > 0 ? ((goldG[i] as number) / mass) * 1e6 : 0;
  }
  return grades;
}

function covariance(a: Float64Array, meanA: number, b: Float64Array, meanB: number): number {
  let sum = 0;
  for (let i = 0; i < a.length; i += 1) sum += ((a[i] as number) - meanA) * ((b[i] as number) - meanB);
  return sum / (a.length - 1);
}
