import { requireBetween, requirePositive } from '../argument.ts';
import { invert } from './invert.ts';

/** One settled assay against the estimate that was sold. */
export interface Outcome {
  classCode: string;
  sellerId: string;
  /** ln(assay / middle of the estimate). */
  logRatio: number;
  /** Sd of the log ratio from assay and estimate together, above 0. */
  sd: number;
}

/** How far classes and sellers are thought to be off before anything is known, sd on the log scale. */
export interface CalibrationPrior {
  classSd: number;
  sellerSd: number;
}

/** Assumed: a class's middle is within ±35 % or so of the truth, a seller within ±20 %. */
export const defaultCalibrationPrior: Readonly<CalibrationPrior> = { classSd: 0.3, sellerSd: 0.15 };

export interface Effect {
  id: string;
  outcomes: number;
  /** What to add to the log of the estimate, shrunk towards 0, and its standard error. */
  logCorrection: number;
  standardError: number;
  /** e^logCorrection: what to multiply the estimate by. */
  factor: number;
}

export interface Calibration {
  classes: Effect[];
  sellers: Effect[];
}

/**
 * Splits how far off estimates were into a part of the class and a part of the seller: log ratio = class + seller + error, all
 * normal, solved together, so that a class is not blamed for one careless seller. Each part is shrunk by its precision.
 * @returns effects in order of first appearance
 * @throws {RangeError} naming the figure that is out of its range
 * Source: mixed model equations, C. R. Henderson, Biometrics 31 (1975) 423–447.
 */
export function calibrate(
  outcomes: readonly Outcome[],
  { classSd, sellerSd }: CalibrationPrior = defaultCalibrationPrior,
): Calibration {
  requirePositive('classSd', classSd);
  requirePositive('sellerSd', sellerSd);
  const classes = namesOf(outcomes.map(({ classCode }) => classCode));
  const sellers = namesOf(outcomes.map(({ sellerId }) => sellerId));
  const size = classes.length + sellers.length;
  const precision = Array.from({ length: size }, (_, i) => {
    const row = new Float64Array(size);
    row[i] = i < classes.length ? classSd ** -2 : sellerSd ** -2;
    return row;
  });
  const pull = new Float64Array(size);
  outcomes.forEach(({ classCode, sellerId, logRatio, sd }, i) => {
    requireBetween(`outcomes[${i}].logRatio`, logRatio, -Infinity);
    requirePositive(`outcomes[${i}].sd`, sd);
    const weight = sd ** -2;
    const parts = [classes.indexOf(classCode), classes.length + sellers.indexOf(sellerId)];
    for (const a of parts) {
      pull[a] = (pull[a] as number) + weight * logRatio;
      const row = precision[a] as Float64Array;
      for (const b of parts) row[b] = (row[b] as number) + weight;
    }
  });
  const covariance = invert(precision);
  const effect = (id: string, i: number, count: number): Effect => {
    const row = covariance[i] as Float64Array;
    const logCorrection = row.reduce((sum, value, j) => sum + value * (pull[j] as number), 0);
    return {
      id,
      outcomes: count,
      logCorrection,
      standardError: Math.sqrt(row[i] as number),
      factor: Math.exp(logCorrection),
    };
  };
  return {
    classes: classes.map((id, i) => effect(id, i, outcomes.filter(({ classCode }) => classCode === id).length)),
    sellers: sellers.map((id, i) =>
      effect(id, classes.length + i, outcomes.filter(({ sellerId }) => sellerId === id).length),
    ),
  };
}

const namesOf = (names: readonly string[]): string[] => [...new Set(names)];
