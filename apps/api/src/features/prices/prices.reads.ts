import type { ReferencePrice } from '@lydite/contracts';
import { LessThanOrEqual, type EntityManager } from 'typeorm';
import { marketNow } from '../../platform/clock.ts';
import { defaultStaleRule, isStale, type StaleRule } from './prices.rules.ts';
import { ReferencePriceRow } from './reference-price.entity.ts';

export { staleRuleOf } from './prices.rules.ts';

export interface PriceInForce {
  id: string;
  /** Minor units per fine gram, with fractions of a minor unit. */
  perGramMinor: number;
  at: Date;
  source: string;
  stale: boolean;
}

/** The newest reference price that was set by now; null before the first. */
export async function priceInForce(
  tx: EntityManager,
  rule: StaleRule = defaultStaleRule,
): Promise<PriceInForce | null> {
  const now = await marketNow(tx);
  const row = await tx.findOne(ReferencePriceRow, { where: { at: LessThanOrEqual(now) }, order: { at: 'DESC' } });
  if (!row) return null;
  const { id, perGramMinor, at, source } = row;
  return { id, perGramMinor, at, source, stale: isStale(at, now, rule) };
}

export const toReferencePrice = ({ perGramMinor, at, source, stale }: PriceInForce): ReferencePrice => ({
  perGramMinor,
  at: at.toISOString(),
  source,
  stale,
});
