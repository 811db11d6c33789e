import { randomUUID } from 'node:crypto';
import type { LineDraft } from '@lydite/contracts';
import { estimateLot, type Catalogue, type Estimate } from '@lydite/valuation';
import type { EntityManager } from 'typeorm';
import { AppError } from '../../platform/app-error.ts';
import { FrozenEstimate } from './estimate.entity.ts';
import { seedOf, toLineInput } from './estimates.rules.ts';

interface FreezeOrder {
  lotId: string;
  lines: (LineDraft & { classCode: string })[];
  catalogue: Catalogue;
  /** The reference price in force, as a record of what the market knew at the listing. */
  referencePriceId: string;
}

/**
 * Computes a lot's estimate and keeps it for good, with all that is needed to compute it again.
 * @throws AppError lot.incomplete when a figure of a line is out of the range that any material can have
 */
export async function freezeEstimate(
  tx: EntityManager,
  { lotId, lines, catalogue, referencePriceId }: FreezeOrder,
): Promise<Estimate> {
  const input = { lines: lines.map(toLineInput) };
  const result = compute(() => estimateLot(input, catalogue, { seed: seedOf(lotId) }));
  await tx.insert(FrozenEstimate, {
    id: randomUUID(),
    lotId,
    modelVersion: result.modelVersion,
    catalogueVersion: result.catalogueVersion,
    seed: result.seed,
    draws: result.draws,
    referencePriceId,
    input,
    result,
    goldP10G: result.goldG.quantiles.p10,
    goldP50G: result.goldG.quantiles.p50,
    goldP90G: result.goldG.quantiles.p90,
    gradeP50GPerT: result.gradeGPerT.p50,
  });
  return result;
}

function compute(estimate: () => Estimate): Estimate {
  try {
    return estimate();
  } catch (cause) {
    if (!(cause instanceof RangeError)) throw cause;
    throw new AppError('lot.incomplete', `The gold cannot be estimated: ${cause.message}. Correct this figure.`, {
      cause,
    });
  }
}
