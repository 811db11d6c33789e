import type { PlanDraws } from '../lot/draw-plan.ts';
import { purchaseMinor, wholeShareMinor, type AssaySale } from './assay-sale.ts';
import type { BuyerTerms } from './buyer-terms.ts';
import { netMinor, returnOf, type Market } from './return.ts';

interface Bid {
  terms: BuyerTerms;
  market: Market;
  sale: AssaySale;
  /** Payable share, 0 … 1. */
  share: number;
}

/**
 * Least content in grams at which a payable share breaks even on a mass. Profit is made of straight pieces in the content, with
 * corners where each side's deduction is reached and where the purchase stops being free.
 * @returns null when no content would do
 */
export function breakEvenContent({ terms, market, sale, share, massG }: Bid & { massG: number }): number | null {
  const worked = returnOf(terms, market);
  const treatment = (sale.treatmentPerKgMinor * massG) / 1000;
  const profit = (goldG: number) => {
    const whole = wholeShareMinor(sale, market.pricePerGMinor, goldG);
    return netMinor(worked, goldG, massG) - purchaseMinor(share, whole, treatment) * (1 + terms.buyerFeeShare);
  };
  const perWholeG = share * (market.pricePerGMinor - sale.refiningPerGMinor);
  const corners = [
    sale.minimumDeductionG,
    worked.payableShare > 0 ? worked.deductionG / worked.payableShare : 0,
    perWholeG > 0 ? sale.minimumDeductionG + treatment / perWholeG : 0,
  ].sort((a, b) => a - b);
  if (profit(0) >= 0) return 0;
  let from = 0;
  for (const to of [...corners, 2 * (corners.at(-1) as number) + 1]) {
    if (profit(to) >= 0) return crossing(profit, from, to);
    from = to;
  }
  // Beyond the last corner there is one straight line left; it must rise to break even at all.
  const slope = profit(from + 1) - profit(from);
  return slope > 0 ? from - profit(from) / slope : null;
}

/** Where a straight line that is negative at `from` and not at `to` meets 0. */
function crossing(line: (x: number) => number, from: number, to: number): number {
  const [below, above] = [line(from), line(to)];
  return from + ((to - from) * -below) / (above - below);
}

/**
 * Least gold price at which a payable share breaks even on average. The expected profit is concave in the price: the return
 * grows in a straight line and the purchase ever faster, so it is followed upwards until it is positive or falls.
 * @returns minor units per gram, or null when no price would do
 */
export function breakEvenPrice(bid: Bid & { draws: Pick<PlanDraws, 'goldG' | 'massG'> }): number | null {
  const profitAt = (pricePerGMinor: number) => expectedProfit({ ...bid, market: { pricePerGMinor } });
  let [low, lowProfit] = [0, profitAt(0)];
  if (lowProfit >= 0) return 0;
  for (let high = bid.market.pricePerGMinor / 8; high < bid.market.pricePerGMinor * 1e4; high *= 1.25) {
    const highProfit = profitAt(high);
    if (highProfit >= 0) return bisect(profitAt, low, high);
    if (highProfit < lowProfit) return null;
    [low, lowProfit] = [high, highProfit];
  }
  return null;
}

function expectedProfit({ draws: { goldG, massG }, terms, market, sale, share }: Parameters<typeof breakEvenPrice>[0]) {
  const worked = returnOf(terms, market);
  let sum = 0;
  for (let i = 0; i < goldG.length; i += 1) {
    const [gold, mass] = [goldG[i] as number, massG[i] as number];
    const whole = wholeShareMinor(sale, market.pricePerGMinor, gold);
    const purchase = purchaseMinor(share, whole, (sale.treatmentPerKgMinor * mass) / 1000);
    sum += netMinor(worked, gold, mass) - purchase * (1 + terms.buyerFeeShare);
  }
  return sum / goldG.length;
}

function bisect(risesThroughZero: (x: number) => number, low: number, high: number): number {
  let [below, above] = [low, high];
  for (let i = 0; i < 60; i += 1) {
    const middle = (below + above) / 2;
    if (risesThroughZero(middle) >= 0) above = middle;
    else below = middle;
  }
  return above;
}
