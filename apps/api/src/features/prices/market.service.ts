import type { MarketView } from '@lydite/contracts';
import { z } from 'zod';
import { marketNow } from '../../platform/clock.ts';
import type { World } from '../../platform/world.ts';
import type { Settings } from '../../settings.ts';
import { priceInForce, staleRuleOf, toReferencePrice } from './prices.reads.ts';

const signIns = z.array(z.object({ role: z.string(), email: z.string() }));

/** Currency, zone, fees and the price in force, as every page needs them. */
export function createMarketService({ db, settings }: Pick<World, 'db' | 'settings'>) {
  const demo = demoOf(settings);
  return {
    async read(): Promise<MarketView> {
      const now = await marketNow(db.manager);
      const price = await priceInForce(db.manager, staleRuleOf(settings));
      const fees: { buyerFeeBp: number; sellerFeeBp: number }[] = await db.query(
        `select buyer_fee_bp as "buyerFeeBp", seller_fee_bp as "sellerFeeBp" from fee_schedules
          where from_day <= ($1::timestamptz at time zone $2)::date order by from_day desc limit 1`,
        [now, settings.MARKET_ZONE],
      );
      return {
        currency: settings.MARKET_CURRENCY,
        zone: settings.MARKET_ZONE,
        now: now.toISOString(),
        ...fees[0]!,
        price: price && toReferencePrice(price),
        demo,
      };
    },
  };
}

/** The stand-ins a demo links to; the sign-ins come as JSON. */
const demoOf = ({ DEMO_MAIL_URL, DEMO_SIGN_INS }: Settings): MarketView['demo'] =>
  DEMO_MAIL_URL ? { mailUrl: DEMO_MAIL_URL, signIns: signIns.parse(JSON.parse(DEMO_SIGN_INS ?? '[]')) } : null;
