import { buyingTerms, type BuyingTerms } from '@lydite/contracts';
import type { DataSource } from 'typeorm';

/** Where a buyer begins: an invented small operator's figures, to be replaced by the buyer's own. */
export const firstTerms: BuyingTerms = {
  recoveryYield: 0.93,
  accountableShare: 0.97,
  processingPerKgMinor: 250,
  batchCostMinor: 4000,
  wantedChance: 0.8,
  marginShare: 0.08,
  rivals: 3,
  curseOn: true,
};

export async function readTerms(db: DataSource, memberId: string): Promise<BuyingTerms> {
  const rows: { content: unknown }[] = await db.query('select content from buying_terms where member_id = $1', [
    memberId,
  ]);
  return rows[0] ? buyingTerms.parse(rows[0].content) : firstTerms;
}

export async function keepTerms(db: DataSource, memberId: string, terms: BuyingTerms): Promise<BuyingTerms> {
  await db.query(
    `insert into buying_terms (member_id, content) values ($1, $2)
     on conflict (member_id) do update set content = excluded.content, updated_at = market_now()`,
    [memberId, JSON.stringify(terms)],
  );
  return terms;
}
