import type { EntityManager } from 'typeorm';

export interface MarketTerms {
  /** IANA zone in which days, deadlines and hours of the market run. */
  zone: string;
  currency: string;
}

/** The market's zone and currency, as every connection was opened with: see createDataSource. */
export async function marketTerms(tx: EntityManager): Promise<MarketTerms> {
  const rows: MarketTerms[] = await tx.query(
    `select current_setting('timezone') as zone, current_setting('lydite.currency') as currency`,
  );
  return rows[0]!;
}
