import { requireBetween, requirePositive } from '../argument.ts';

/** How a material is to be sampled, in Gy's terms. */
export interface Sampling {
  /** Size of the largest pieces, cm (95 % pass). */
  d: number;
  /** Shape factor, about 0.5; 1 for cubes, down to 0.1 for flakes. */
  f: number;
  /** Size range factor, 0.25 for a wide range to 1 for one size. */
  g: number;
  /** Composition factor, g/cm³; for a metal at grade a (0 … 1) about its density / a. */
  c: number;
  /** Liberation factor, 0 … 1: 1 when the gold lies free. */
  l: number;
  /** Power of d: 3 by theory; for metallic gold nearer 1 to 1.5 (Minnitt 2017). 3 by default. */
  exponent?: number;
  lotMassG: number;
}

/**
 * Relative standard deviation that taking a sample must at least have: √(f·g·c·l·d³·(1/sample − 1/lot)).
 * @param sampleMassG grams, above 0, at most the lot's mass
 * @throws {RangeError} naming the figure that is out of its range
 * Source: P. M. Gy, Sampling of Particulate Materials, 1979.
 */
export function fundamentalSamplingError({ sampleMassG, ...sampling }: Sampling & { sampleMassG: number }): number {
  const constantG = samplingConstantG(sampling);
  requirePositive('sampleMassG', sampleMassG);
  requireBetween('sampleMassG', sampleMassG, 0, sampling.lotMassG);
  return Math.sqrt(constantG * (1 / sampleMassG - 1 / sampling.lotMassG));
}

/**
 * Least sample, grams, whose relative standard deviation is at most the one wanted; never more than the lot.
 * @param relativeSd above 0
 * @throws {RangeError} naming the figure that is out of its range
 */
export function leastSampleMass({ relativeSd, ...sampling }: Sampling & { relativeSd: number }): number {
  const constantG = samplingConstantG(sampling);
  requirePositive('relativeSd', relativeSd);
  return 1 / (relativeSd ** 2 / constantG + 1 / sampling.lotMassG);
}

/** f·g·c·l·d^exponent: the relative variance of a sample of one gram from a boundless lot. */
function samplingConstantG({ d, f, g, c, l, exponent = 3, lotMassG }: Sampling): number {
  for (const [name, value] of Object.entries({ d, f, g, c, lotMassG })) requirePositive(name, value);
  requirePositive('l', l);
  requireBetween('l', l, 0, 1);
  requireBetween('exponent', exponent, 0, 3);
  return f * g * c * l * d ** exponent;
}
