import type { BuyerTerms } from './buyer-terms.ts';
import { curseFactor } from './curse-factor.ts';

/** The gold price in force, in minor units of the market's currency per fine gram; not necessarily whole. */
export interface Market {
  pricePerGMinor: number;
}

/** A buyer's terms worked out to what one draw needs: all amounts in minor units, all gold in grams. */
export interface Return {
  /** Share of the contained gold that comes out and is accounted for, after the allowance for the winner's curse. */
  payableShare: number;
  deductionG: number;
  /** What the refiner pays for a payable gram, less refining. */
  paidPerGMinor: number;
  treatmentPerGMinor: number;
  /** Value today of one unit of money on the day of cash. */
  discount: number;
  processingPerGMinor: number;
  fixedCostMinor: number;
  feeShare: number;
}

export function returnOf(terms: BuyerTerms, { pricePerGMinor }: Market): Return {
  return {
    payableShare: terms.recoveryYield * terms.accountableShare * curseFactor(terms),
    deductionG: terms.minimumDeductionG,
    paidPerGMinor: pricePerGMinor * (1 - terms.priceHaircut) - terms.refiningPerGMinor,
    treatmentPerGMinor: terms.treatmentPerKgMinor / 1000,
    discount: (1 + terms.annualCostOfMoney) ** (-terms.daysToCash / 365),
    processingPerGMinor: terms.processingPerKgMinor / 1000,
    fixedCostMinor: terms.batchCostMinor + terms.freightMinor + terms.assayCostMinor,
    feeShare: terms.buyerFeeShare,
  };
}

export function payableG({ payableShare, deductionG }: Return, goldG: number): number {
  return Math.max(0, goldG * payableShare - deductionG);
}

/** What is left before the purchase: the refiner's payment at its value today, less all costs on day 0. May be negative. */
export function netMinor(terms: Return, goldG: number, massG: number): number {
  const inflow = payableG(terms, goldG) * terms.paidPerGMinor - terms.treatmentPerGMinor * massG;
  return inflow * terms.discount - terms.processingPerGMinor * massG - terms.fixedCostMinor;
}

/** What the refiner's payment, before treatment, must come to for a bid to break even. */
function neededMinor(terms: Return, bidMinor: number, massG: number): number {
  const costs = bidMinor * (1 + terms.feeShare) + terms.processingPerGMinor * massG + terms.fixedCostMinor;
  return costs / terms.discount + terms.treatmentPerGMinor * massG;
}

/** Contained gold at which a bid on this mass breaks even; null when no amount of gold would do. */
export function breakEvenGold(terms: Return, bidMinor: number, massG: number): number | null {
  if (!(terms.paidPerGMinor > 0 && terms.payableShare > 0)) return null;
  return (neededMinor(terms, bidMinor, massG) / terms.paidPerGMinor + terms.deductionG) / terms.payableShare;
}

/** Payment per payable gram, less refining, at which a bid breaks even on average; null without payable gold. */
export function breakEvenPayment(
  terms: Return,
  bidMinor: number,
  meanPayableG: number,
  meanMassG: number,
): number | null {
  return meanPayableG > 0 ? neededMinor(terms, bidMinor, meanMassG) / meanPayableG : null;
}
