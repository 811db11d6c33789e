import { requireBetween, requirePositive } from '../argument.ts';

/** A buyer's own terms. Money in minor units of the market's currency, not necessarily whole; shares 0 … 1. */
export interface BuyerTerms {
  /** Share of the contained gold that the process brings out. */
  recoveryYield: number;
  /** Share of the recovered gold that the refiner pays for. */
  accountableShare: number;
  /** Fine gold the refiner keeps of each batch, grams. */
  minimumDeductionG: number;
  /** Share below the reference price at which the refiner pays. */
  priceHaircut: number;
  refiningPerGMinor: number;
  treatmentPerKgMinor: number;
  processingPerKgMinor: number;
  batchCostMinor: number;
  freightMinor: number;
  assayCostMinor: number;
  /** The market's fee as a share of the purchase. */
  buyerFeeShare: number;
  daysToCash: number;
  annualCostOfMoney: number;
  /** Wanted expected profit as a share of the bid. */
  margin: number;
  /** Wanted chance of not losing money, above 0. */
  wantedChance: number;
  /** Whether to allow for the winner's curse: who wins among several has on average reckoned too high. */
  winnersCurse: boolean;
  /** Other bidders of like skill, a whole number. */
  rivals: number;
  /** Standard deviation, on the log scale, of a bidder's own error about the gold. */
  tau: number;
}

/** A small operator's terms. Assumed, to be replaced by the buyer's own. */
export const defaultTerms: Readonly<BuyerTerms> = {
  recoveryYield: 0.92,
  accountableShare: 0.97,
  minimumDeductionG: 0,
  priceHaircut: 0.01,
  refiningPerGMinor: 60,
  treatmentPerKgMinor: 0,
  processingPerKgMinor: 250,
  batchCostMinor: 15_000,
  freightMinor: 6_000,
  assayCostMinor: 9_000,
  buyerFeeShare: 0.02,
  daysToCash: 45,
  annualCostOfMoney: 0.08,
  margin: 0.1,
  wantedChance: 0.75,
  winnersCurse: true,
  rivals: 3,
  tau: 0.12,
};

const shares = ['recoveryYield', 'accountableShare', 'priceHaircut', 'buyerFeeShare', 'wantedChance'] as const;
const amounts = [
  'minimumDeductionG',
  'refiningPerGMinor',
  'treatmentPerKgMinor',
  'processingPerKgMinor',
  'batchCostMinor',
  'freightMinor',
  'assayCostMinor',
  'daysToCash',
  'annualCostOfMoney',
  'margin',
  'tau',
] as const;

/** @throws {RangeError} naming the term that is out of its range, for example `terms.recoveryYield` */
export function requireTerms(terms: BuyerTerms): void {
  for (const share of shares) requireBetween(`terms.${share}`, terms[share], 0, 1);
  for (const amount of amounts) requireBetween(`terms.${amount}`, terms[amount], 0);
  requirePositive('terms.wantedChance', terms.wantedChance);
  requireBetween('terms.rivals', terms.rivals, 0, 1000);
  if (!Number.isInteger(terms.rivals)) throw new RangeError(`terms.rivals must be a whole number, not ${terms.rivals}`);
}
