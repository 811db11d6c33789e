import type { Estimate, LotInput } from '@lydite/valuation';
import type { EntityManager } from 'typeorm';
import { FrozenEstimate } from './estimate.entity.ts';

export { toOutline, type OutlineParts } from './estimates.rules.ts';

export interface StoredEstimate {
  input: LotInput;
  result: Estimate;
  referencePriceId: string;
}

/** The frozen estimate of a lot; null for a draft. */
export async function estimateOf(tx: EntityManager, lotId: string): Promise<StoredEstimate | null> {
  const row = await tx.findOneBy(FrozenEstimate, { lotId });
  return row && { input: row.input, result: row.result, referencePriceId: row.referencePriceId };
}
