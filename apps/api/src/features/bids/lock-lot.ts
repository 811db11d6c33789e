import type { SaleForm } from '@lydite/contracts';
import type { EntityManager } from 'typeorm';
import { AppError } from '../../platform/app-error.ts';
import { marketNow } from '../../platform/clock.ts';
import type { Auction } from './bids.rules.ts';

export interface LockedLot extends Auction {
  id: string;
  code: string;
  title: string;
  sellerId: string;
  state: string;
  form: SaleForm;
  askingMinor: number | null;
  freightMinor: number;
  closesAt: Date;
  latestClosesAt: Date;
  seq: number;
  bidders: number;
}

const columns = `id, code, title, seller_id as "sellerId", state, form, start_minor::int as "startMinor", reserve_minor::int as "reserveMinor",
  asking_minor::int as "askingMinor", coalesce(freight_minor, 0)::int as "freightMinor", price_minor::int as "priceMinor", leader_id as "leaderId",
  leader_ceiling_minor::int as "leaderCeilingMinor", closes_at as "closesAt", latest_closes_at as "latestClosesAt", seq, bidders`;

/**
 * Locks a listed lot until the end of the transaction, then reads the clock: whoever waited for the lock is judged by the time they got it.
 * @throws AppError lot.not_found for a draft or no lot at all
 */
export async function lockLot(
  tx: EntityManager,
  by: { code: string } | { id: string },
): Promise<{ lot: LockedLot; now: Date }> {
  const [column, value] = 'code' in by ? ['code', by.code] : ['id', by.id];
  const rows: LockedLot[] = await tx.query(
    `select ${columns} from lots where ${column} = $1 and state not in ('draft', 'in_review', 'deleted') for update`,
    [value],
  );
  if (!rows[0]) throw new AppError('lot.not_found', 'There is no such lot on the market.');
  return { lot: rows[0], now: await marketNow(tx) };
}

/** Locks the member's row, so that bids of one buyer on several lots are weighed against the limit one after the other. */
export async function lockBuyer(tx: EntityManager, memberId: string): Promise<{ limitMinor: number }> {
  const rows: { limitMinor: number }[] = await tx.query(
    'select limit_minor::int as "limitMinor" from members where id = $1 for no key update',
    [memberId],
  );
  return rows[0]!;
}
