import { beadsAhead, type MoneyScale, type StreakBid } from '@lydite/ui';
import {
  simulateLot,
  valueLot,
  type BuyerTerms,
  type Catalogue,
  type LineInput,
  type LotDraws,
  type LotValue,
} from '@lydite/valuation';
import type { LotView } from '@lydite/contracts';

/** What one bid means for the buyer who makes it. Money in minor units, rounded to whole ones. */
export interface BidReading {
  bid: StreakBid;
  /** Beads at or above break-even, of all. */
  ahead: number;
  of: number;
  /** Profit in the middle case, and where one result in ten is worse or better. */
  middleMinor: number;
  worseMinor: number;
  betterMinor: number;
}

export interface LotWorth {
  money: MoneyScale;
  /** Largest bid within the buyer's terms; null when nothing is safe to pay. */
  safeBidMinor: number | null;
  /** Own costs that don't depend on the bid, at the lot's mass. */
  costsMinor: number;
  breakEvenG: (amountMinor: number) => number;
  read: (amountMinor: number) => BidReading;
}

/**
 * Draws a listed lot again, as its frozen estimate was drawn: same lines, catalogue version and seed, so the same numbers.
 * @throws {RangeError} when the catalogue is not the estimate's own
 */
export function drawAgain({ lines, estimate }: Pick<LotView, 'lines' | 'estimate'>, catalogue: Catalogue): LotDraws {
  const input = { lines: lines.map((line): LineInput => ({ ...line, classCode: line.classCode ?? '' })) };
  return simulateLot(input, catalogue, { seed: estimate.seed, draws: estimate.draws });
}

const probeMinor = 1_000_000;

/** A break-even is a straight line in the bid; null when no amount of gold would do. */
function moneyScaleOf({ breakEvenGoldG }: Pick<LotValue, 'breakEvenGoldG'>, currency: string): MoneyScale | null {
  const [atNothing, atProbe] = [breakEvenGoldG(0), breakEvenGoldG(probeMinor)];
  if (atNothing === null || atProbe === null) return null;
  const perGMinor = probeMinor / (atProbe - atNothing);
  return { currency, perGMinor, atZeroMinor: -atNothing * perGMinor };
}

interface WorthInput {
  draws: Pick<LotDraws, 'goldG' | 'massG'>;
  beadsG: readonly number[];
  massG: number;
  terms: BuyerTerms;
  pricePerGMinor: number;
  currency: string;
}

/** What a lot is worth to one buyer; null when the buyer's terms leave nothing of a gram of gold. */
export function lotWorth({ draws, beadsG, massG, terms, pricePerGMinor, currency }: WorthInput): LotWorth | null {
  const value = valueLot(draws, terms, { pricePerGMinor });
  const money = moneyScaleOf(value, currency);
  if (!money) return null;
  const breakEvenG = (amountMinor: number) => (amountMinor - money.atZeroMinor) / money.perGMinor;
  return {
    money,
    safeBidMinor: value.highestSafeBidMinor,
    costsMinor: Math.round((terms.processingPerKgMinor * massG) / 1000 + terms.batchCostMinor + terms.freightMinor),
    breakEvenG,
    read: (amountMinor) => {
      const profit = value.profitQuantilesMinor(amountMinor);
      const bid = {
        amountMinor,
        breakEvenG: breakEvenG(amountMinor),
        resultPerGMinor: money.perGMinor * (1 + terms.buyerFeeShare),
      };
      return {
        bid,
        ahead: beadsAhead(beadsG, bid.breakEvenG),
        of: beadsG.length,
        middleMinor: Math.round(profit.p50),
        worseMinor: Math.round(profit.p10),
        betterMinor: Math.round(profit.p90),
      };
    },
  };
}

/** Gold at which a bid on a lot of this mass breaks even, where only its outline is known; null when no amount would do. */
export function breakEvenAtMass(massG: number, terms: BuyerTerms, pricePerGMinor: number) {
  const one = { goldG: Float64Array.of(0), massG: Float64Array.of(massG) };
  const value = valueLot(one, terms, { pricePerGMinor });
  return (amountMinor: number) => value.breakEvenGoldG(amountMinor);
}
