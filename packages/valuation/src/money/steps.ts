import type { BuyerTerms } from './buyer-terms.ts';
import { curseFactor } from './curse-factor.ts';
import type { Market, Return } from './return.ts';

export type StepKey =
  | 'contained'
  | 'winnersCurse'
  | 'recovery'
  | 'accountable'
  | 'deduction'
  | 'haircut'
  | 'refining'
  | 'treatment'
  | 'costOfMoney'
  | 'processing'
  | 'batch'
  | 'freight'
  | 'assay'
  | 'purchase'
  | 'buyerFee';

/** One row of the stepped chart: what it adds or takes, in whole minor units and in fine grams at the reference price. */
export interface Step {
  key: StepKey;
  amountMinor: number;
  fineG: number;
}

export interface Steps {
  rows: Step[];
  /** Expected profit; exactly the sum of the rows. */
  profit: { amountMinor: number; fineG: number };
}

interface Means {
  goldG: number;
  massG: number;
  payableG: number;
}

/** The way from contained gold down to profit on average over the draws; rows that take nothing are left out. */
export function stepsOf(bidMinor: number, terms: BuyerTerms, market: Market, worked: Return, means: Means): Steps {
  const price = market.pricePerGMinor;
  const amounts = inOrder(bidMinor, terms, price, worked, means);
  const rows: Step[] = [];
  // Rounding the running sum, and not each row, makes the rows add up to the cent.
  let [sum, rounded] = [0, 0];
  for (const [key, amount] of amounts) {
    sum += amount;
    const next = Math.round(sum);
    const amountMinor = next - rounded;
    rounded = next;
    if (amountMinor !== 0) rows.push({ key, amountMinor, fineG: amountMinor / price });
  }
  return { rows, profit: { amountMinor: rounded, fineG: rounded / price } };
}

function inOrder(
  bidMinor: number,
  terms: BuyerTerms,
  price: number,
  worked: Return,
  means: Means,
): [StepKey, number][] {
  const ownG = means.goldG * curseFactor(terms);
  const recoveredG = ownG * terms.recoveryYield;
  const accountedG = recoveredG * terms.accountableShare;
  const massKg = means.massG / 1000;
  const inflow = means.payableG * worked.paidPerGMinor - terms.treatmentPerKgMinor * massKg;
  return [
    ['contained', means.goldG * price],
    ['winnersCurse', (ownG - means.goldG) * price],
    ['recovery', (recoveredG - ownG) * price],
    ['accountable', (accountedG - recoveredG) * price],
    ['deduction', (means.payableG - accountedG) * price],
    ['haircut', -means.payableG * price * terms.priceHaircut],
    ['refining', -means.payableG * terms.refiningPerGMinor],
    ['treatment', -terms.treatmentPerKgMinor * massKg],
    ['costOfMoney', -inflow * (1 - worked.discount)],
    ['processing', -terms.processingPerKgMinor * massKg],
    ['batch', -terms.batchCostMinor],
    ['freight', -terms.freightMinor],
    ['assay', -terms.assayCostMinor],
    ['purchase', -bidMinor],
    ['buyerFee', -bidMinor * terms.buyerFeeShare],
  ];
}
