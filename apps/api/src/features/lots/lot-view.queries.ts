import type { EntityManager } from 'typeorm';
import { In, Not } from 'typeorm';
import { AppError } from '../../platform/app-error.ts';
import { Lot } from './lot.entity.ts';

/** A lot that has been on the market. @throws AppError lot.not_found for drafts, lots in review and no lot at all */
export async function findListedLot(tx: EntityManager, lotCode: string): Promise<Lot> {
  const lot = await tx.findOneBy(Lot, { code: lotCode, state: Not(In(['draft', 'in_review', 'deleted'])) });
  if (!lot) throw new AppError('lot.not_found', 'There is no such lot on the market.');
  return lot;
}

/** A seller's settled deals, and the median share by which masses that were weighed in differed from the declared ones. */
export async function sellerRecord(
  tx: EntityManager,
  sellerId: string,
): Promise<{ deliveredLots: number; medianMassDifference: number | null }> {
  const rows: { deliveredLots: number; medianMassDifference: number | null }[] = await tx.query(
    `select count(*)::int as "deliveredLots",
            percentile_cont(0.5) within group (order by abs(w.net_g / l.mass_g - 1)::float8) filter (where w.entered_by is not null) as "medianMassDifference"
       from deals d join lots l on l.id = d.lot_id left join weigh_ins w on w.deal_id = d.id
      where d.seller_id = $1 and d.state = 'settled'`,
    [sellerId],
  );
  return rows[0]!;
}

/** Code of the deal on this lot that the member is a side of; null for everybody else. */
export async function ownDealCode(
  tx: EntityManager,
  { lotId, memberId }: { lotId: string; memberId: string },
): Promise<string | null> {
  const rows: { code: string }[] = await tx.query(
    `select code from deals where lot_id = $1 and $2 in (seller_id, buyer_id) order by state = 'cancelled', awarded_at desc limit 1`,
    [lotId, memberId],
  );
  return rows[0]?.code ?? null;
}
