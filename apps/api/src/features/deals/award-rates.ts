import type { EntityManager } from 'typeorm';

export interface Award {
  sellerId: string;
  buyerId: string;
  priceMinor: number;
  freightMinor: number;
}

interface Rates {
  buyerFeeBp: number;
  sellerFeeBp: number;
  buyerTaxBp: number;
  sellerTaxBp: number;
}

/** The fees of the schedule in force today, and each side's tax on them. */
export async function ratesFor(
  tx: EntityManager,
  { sellerId, buyerId }: Pick<Award, 'sellerId' | 'buyerId'>,
): Promise<Rates> {
  const rows: Rates[] = await tx.query(
    `select f.buyer_fee_bp as "buyerFeeBp", f.seller_fee_bp as "sellerFeeBp", b.tax_bp as "buyerTaxBp", s.tax_bp as "sellerTaxBp"
       from fee_schedules f, members b, members s
      where f.from_day <= market_now()::date and b.id = $1 and s.id = $2 order by f.from_day desc limit 1`,
    [buyerId, sellerId],
  );
  return rows[0]!;
}
