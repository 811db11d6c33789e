import type { EntityManager } from 'typeorm';
import { AppError } from '../../platform/app-error.ts';

export interface DealToPay {
  id: string;
  code: string;
  title: string;
  lotCode: string;
  buyerEmail: string;
}

/** What the payment page says of a deal. @throws AppError deal.not_found for no deal, or one the member does not buy in */
export async function dealToPay(
  tx: EntityManager,
  { code, buyerId }: { code: string; buyerId: string },
): Promise<DealToPay> {
  const rows: DealToPay[] = await tx.query(
    `select d.id, d.code, l.title, l.code as "lotCode", m.email as "buyerEmail" from deals d
       join lots l on l.id = d.lot_id join members m on m.id = d.buyer_id
      where d.code = $1 and d.buyer_id = $2`,
    [code, buyerId],
  );
  if (!rows[0]) throw new AppError('deal.not_found', 'There is no such deal of yours.');
  return rows[0];
}
