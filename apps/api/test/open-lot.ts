import { randomUUID } from 'node:crypto';
import type { LotDraft } from '@lydite/contracts';
import type { Market } from './market.ts';
import { completeDraft } from './lot-drafts.ts';

interface OpenLot {
  sellerId: string;
  startMinor?: number;
  reserveMinor?: number | null;
  /** Given, the lot has an asking price instead of taking bids. */
  askingMinor?: number;
  /** An interval of PostgreSQL from now; negative for a lot whose close is past. */
  closesIn?: string;
}

/** A lot as listing leaves it, without photos and estimate: all that bidding and delivery need. */
export async function addOpenLot({ db }: Pick<Market, 'db'>, lot: OpenLot): Promise<{ id: string; code: string }> {
  const { sellerId, startMinor = 40_000, reserveMinor = null, askingMinor, closesIn = '3 days' } = lot;
  const draft: LotDraft = completeDraft();
  const rows: { id: string; code: string }[] = await db.query(
    `insert into lots (id, seller_id, state, draft, title, description, form, basis, place, country, delivery_way, delivery_hours, freight_minor,
                       start_minor, reserve_minor, asking_minor, mass_g, mass_evidence, pieces, class_codes, listed_at, first_closes_at, closes_at, latest_closes_at)
     select $1, $2, 'open', $3, $4, $5, $6, 'outright', $7, $8, $9, '', 1800, $10, $11, $12, 12400, 'weighed', 560, '{memory-modules}',
            now - interval '1 day', now + $13::interval, now + $13::interval, now + $13::interval + interval '2 hours' from market_now() as now
     returning id, code`,
    [
      randomUUID(),
      sellerId,
      JSON.stringify(draft),
      draft.title,
      draft.description,
      askingMinor === undefined ? 'open-bids' : 'asking-price',
      draft.delivery.place,
      draft.declarations.country,
      draft.delivery.way,
      askingMinor === undefined ? startMinor : null,
      reserveMinor,
      askingMinor ?? null,
      closesIn,
    ],
  );
  return rows[0]!;
}
