import { marketNow } from '../../platform/clock.ts';
import type { World } from '../../platform/world.ts';
import { recordPrices } from './prices.commands.ts';

const yearMs = 366 * 24 * 3_600_000;

/**
 * Asks the price service for what was published since the newest known price, the last year at the first time.
 * Prices in another currency than the market's are a wrong setting and are refused.
 */
export async function takePrices({ db, prices, settings }: Pick<World, 'db' | 'prices' | 'settings'>): Promise<void> {
  const rows: { at: Date | null }[] = await db.query('select max(at) as at from reference_prices');
  const from = rows[0]!.at ?? new Date((await marketNow(db.manager)).getTime() - yearMs);
  const quotes = await prices.since(from);
  const foreign = quotes.find((quote) => quote.currency !== settings.MARKET_CURRENCY);
  if (foreign)
    throw new Error(`The price service quotes ${foreign.currency}, the market runs in ${settings.MARKET_CURRENCY}`);
  if (quotes.length > 0) await recordPrices(db.manager, quotes);
}
